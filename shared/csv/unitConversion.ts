import { unitLabels } from '../contracts/quantities.ts';
import { headerUnits } from '../engineering/units.ts';

import type { Quantity } from '../contracts/tableColumns.ts';
import type { UnitSystem } from '../engineering/input.ts';
import type { HeaderDimension } from '../engineering/units.ts';

const dimensions: Readonly<Record<Quantity, HeaderDimension | null>> = {
  length: 'length',
  thickness: 'length',
  area: 'area',
  force: 'force',
  moment: 'moment',
  concreteStrength: 'stress',
  steelStrength: 'stress',
  density: 'density',
  fraction: null,
  plain: null,
};

export type UnitReading =
  | { readonly ok: true; readonly unit: string; readonly convert: ((value: number) => number) | null }
  | { readonly ok: false; readonly message: string };

/** The unit as `headerUnits` spells it: superscripts, dots for a product and letter case are forgiven where nothing is lost. */
function knownUnit(typed: string): string | null {
  const spelled = typed
    .replace('²', '2')
    .replace('³', '3')
    .replace(/[·⋅*.]/, '-')
    .replace(/\s/g, '');
  if (Object.hasOwn(headerUnits, spelled)) return spelled;
  if (/^mN/.test(spelled)) return null;
  const folded = spelled.toLowerCase();
  return Object.keys(headerUnits).find((unit) => unit.toLowerCase() === folded) ?? null;
}

/** Multiplies or divides by the whole-number side of a ratio, so that 138 in reads 11.5 ft and 240 mm reads 0.24 m exactly. */
function converter(fromBase: number, toBase: number): ((value: number) => number) | null {
  const wholeIfNear = (ratio: number): number =>
    Math.abs(ratio - Math.round(ratio)) <= 1e-12 * ratio ? Math.round(ratio) : ratio;
  if (fromBase === toBase) return null;
  if (fromBase > toBase) {
    const factor = wholeIfNear(fromBase / toBase);
    return (value) => value * factor;
  }
  const divisor = wholeIfNear(toBase / fromBase);
  return (value) => value / divisor;
}

/** What a unit in a header means for a column of this quantity in a building of these units. */
export function readUnit(typed: string, quantity: Quantity, units: UnitSystem): UnitReading {
  const dimension = dimensions[quantity];
  if (dimension === null) {
    return {
      ok: false,
      message: `names the unit ${typed}, but its numbers have none; take the unit out of the header`,
    };
  }
  const fitting = Object.keys(headerUnits).filter((unit) => headerUnits[unit]?.dimension === dimension);
  const unit = knownUnit(typed);
  const from = unit === null ? undefined : headerUnits[unit];
  if (unit === null || from === undefined || from.dimension !== dimension) {
    const why = unit === null ? 'which is not known' : 'which measures something else';
    return { ok: false, message: `names the unit ${typed}, ${why}; write one of ${fitting.join(', ')}` };
  }
  const own = headerUnits[unitLabels[quantity][units]];
  return { ok: true, unit, convert: own ? converter(from.inBase, own.inBase) : null };
}
