import { rulesFor } from '../codes/rulesFor.ts';
import type { Warning } from '../input.ts';
import type { ModelSettings } from '../model/model.ts';
import { megapascalsPerPsi, psiPerKsi } from '../units.ts';

/**
 * Notices for materials above the edition's limits: the formula takes the limit (engineering.md section 6). `fcPsi` are the strengths that
 * occur in the walls. Caps: sqrt(f'c) 100 psi in shear and development, fyt 60 ksi in shear, fy 60 ksi in shear friction, fy 100 ksi in
 * flexure and 80 ksi in the axial cap Po (22.4.2.1).
 */
export function materialNotices(settings: ModelSettings, fcPsi: readonly number[]): Warning[] {
  const { caps } = rulesFor(settings.code);
  const metric = settings.units === 'si';
  const printed = (ksi: number): string =>
    metric
      ? `${String(Math.round(ksi * psiPerKsi * megapascalsPerPsi * 10) / 10)} MPa`
      : `${String(Math.round(ksi * 100) / 100)} ksi`;
  const notices: Warning[] = [];
  const tell = (name: string, ksi: number, capKsi: number, where: string): void => {
    if (ksi <= capKsi * (1 + 1e-9)) return;
    notices.push({
      code: 'material-capped',
      message: `${name} ${printed(ksi)} counts as ${printed(capKsi)} in ${where}`,
    });
  };
  tell('fyt', settings.fytKsi, caps.fytShearKsi, 'wall shear (20.2.2.4)');
  tell('fy', settings.fyKsi, caps.fyFrictionKsi, 'shear friction of joints (20.2.2.4)');
  tell('fy', settings.fyKsi, caps.fyAxialKsi, 'the axial cap (22.4.2.1)');
  tell('fy', settings.fyKsi, caps.fyFlexureKsi, 'flexure (20.2.2.4)');
  const largest = Math.max(0, ...fcPsi);
  const capPsi = caps.rootFcPsi * caps.rootFcPsi;
  if (largest > capPsi * (1 + 1e-9)) {
    const strength = metric
      ? `${String(Math.round(largest * megapascalsPerPsi * 10) / 10)} MPa`
      : `${String(Math.round(largest))} psi`;
    notices.push({
      code: 'material-capped',
      message: `f'c ${strength}: sqrt(f'c) counts as ${metric ? '8.3 MPa' : '100 psi'} in shear and development (22.5.3.1, 25.4.1.4)`,
    });
  }
  return notices;
}
