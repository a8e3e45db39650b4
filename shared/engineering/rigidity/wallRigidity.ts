import { concreteModulusKsi } from './concreteModulus.ts';

export interface WallRigidityInput {
  readonly heightIn: number;
  readonly lengthIn: number;
  readonly thicknessIn: number;
  readonly fcPsi: number;
  readonly flexureFactor: number;
  readonly shearFactor: number;
  /** 3 cantilever, 12 fixed at both ends */
  readonly endFactor: 3 | 12;
  /** pcf, or null for normal weight */
  readonly unitWeightPcf: number | null;
}

/**
 * Rigidity of one wall in one story, kip/in: k = 1/d, d = h^3/(c Ec Ie) + 1.2 h/(G Ae), Ie = flexure factor x t lw^3/12,
 * Ae = shear factor x t lw, G = 0.4 Ec, c = 3 or 12. Elementary beam theory with shear (handbook formula of cantilever and
 * fixed piers; factors ACI 318-19 6.6.3.1). Out-of-plane stiffness is neglected.
 */
export function wallRigidityKipPerIn(wall: WallRigidityInput): number {
  const modulusKsi = concreteModulusKsi(wall.fcPsi, wall.unitWeightPcf);
  const { heightIn: h, lengthIn: l, thicknessIn: t } = wall;
  const inertiaIn4 = (wall.flexureFactor * t * l * l * l) / 12;
  const areaIn2 = wall.shearFactor * t * l;
  const flexure = (h * h * h) / (wall.endFactor * modulusKsi * inertiaIn4);
  const shear = (1.2 * h) / (0.4 * modulusKsi * areaIn2);
  return 1 / (flexure + shear);
}
