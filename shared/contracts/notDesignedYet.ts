import type { Settings } from '../engineering/input.ts';

export interface SettingProblem {
  /** path of the key in building.json, parts joined by points */
  readonly column: string | null;
  readonly message: string;
  readonly code?: 'not-designed-yet';
}

/**
 * Settings that the contract knows and this version does not compute: refused, never passed over. When the work behind a line
 * is built, its line goes.
 */
export function notDesignedYet(settings: Settings): SettingProblem[] {
  const problems: SettingProblem[] = [];
  const refuse = (column: string, asked: boolean, read: string, instead: string): void => {
    if (!asked) return;
    problems.push({
      column,
      message: `${column} reads ${read}, which is not designed yet; ${instead}`,
      code: 'not-designed-yet',
    });
  };
  refuse('code', settings.code === 'aci318-14', settings.code, 'use aci318-19');
  refuse('wallClass', settings.wallClass === 'special', settings.wallClass, 'use ordinary');
  refuse('shearMethod', settings.shearMethod === 'detailed', settings.shearMethod, 'use simplified');
  const critical = Object.keys(settings.criticalLevel);
  refuse('criticalLevel', critical.length > 0, `levels for ${critical.slice(0, 5).join(', ')}`, 'leave it out');
  refuse('mergeShare', settings.mergeShare > 0, String(settings.mergeShare), 'use 0');
  return problems;
}
