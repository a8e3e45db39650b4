import { z } from 'zod';

import { nearestName } from './nearestName.ts';
import { notDesignedYet } from './notDesignedYet.ts';
import { barSizes, settingsDefaults, spacingLimits } from './settingsDefaults.ts';
import { settingsMessage } from './settingsMessage.ts';

import type { Settings, UnitSystem } from '../engineering/input.ts';
import type { SettingProblem } from './notDesignedYet.ts';

/** Control characters can't stand in a workbook's header. */
const printable = /^\P{Cc}*$/u;
const positive = z.number().gt(0).max(1e12);
const notNegative = z.number().min(0).max(1e12);
const fraction = z.number().min(0).max(1);
const barList = z.strictObject({
  sizes: z.array(z.number()).min(1).max(50).optional(),
  spacings: z.array(positive).min(1).max(50).optional(),
});
const endBarList = z.strictObject({ sizes: barList.shape.sizes, spacings: z.array(positive).max(50).optional() });

/** building.json as typed. Keys, values and defaults are those of the contract; limits that need the units follow below. */
export const typedSettingsSchema = z.strictObject({
  name: z.string().trim().min(1).max(200).regex(printable),
  number: z.string().trim().max(100).regex(printable).optional(),
  units: z.enum(['us', 'si']),
  code: z.enum(['aci318-19', 'aci318-14']).optional(),
  loads: z.enum(['asce7-22', 'asce7-16']).optional(),
  wallClass: z.enum(['ordinary', 'special']).optional(),
  fc: positive.optional(),
  fy: positive.optional(),
  fyt: positive.optional(),
  lambda: z.number().gt(0).max(1).optional(),
  concreteWeight: positive.optional(),
  selfWeight: z.boolean().optional(),
  cover: positive.optional(),
  edge: positive.optional(),
  joint: z.enum(['roughened', 'plain']).optional(),
  slabThickness: positive.optional(),
  stiffness: z
    .strictObject({
      flexure: positive.optional(),
      shear: positive.optional(),
      end: z.enum(['cantilever', 'fixed']).optional(),
      unitWeight: positive.nullable().optional(),
    })
    .optional(),
  basis: z
    .array(z.enum(['rigid', 'compatible', 'flexible', 'envelope']))
    .min(1)
    .max(4)
    .optional(),
  accidental: fraction.optional(),
  amplify: z.boolean().optional(),
  orthogonal: fraction.optional(),
  windCases: z.boolean().optional(),
  liveReduction: z.boolean().optional(),
  liveFactor: z.number().min(0.5).max(1).optional(),
  kll: positive.optional(),
  sds: z.number().min(0).max(10).optional(),
  rho: z.number().min(1).max(2).optional(),
  omega0: z.number().min(1).max(10).optional(),
  cd: z.number().gt(0).max(20).optional(),
  ie: z.number().min(1).max(2).optional(),
  sdc: z.enum(['A', 'B', 'C', 'D', 'E', 'F']).nullable().optional(),
  riskCategory: z.enum(['I', 'II', 'III', 'IV']).optional(),
  driftLimit: z.number().gt(0).max(1).nullable().optional(),
  windDriftFactor: z.number().gt(0).max(1).optional(),
  shearMethod: z.enum(['simplified', 'detailed']).optional(),
  forcesAre: z.enum(['level-force', 'story-shear']).optional(),
  forceLevel: z.enum(['strength', 'service']).optional(),
  expectedBaseShear: z.record(z.string(), z.number()).optional(),
  criticalLevel: z.record(z.string(), z.string()).optional(),
  baseSprings: z.record(z.string(), positive).optional(),
  oopEccentricity: notNegative.optional(),
  bandStories: z.number().int().min(1).max(200).optional(),
  mergeShare: fraction.optional(),
  bars: z
    .strictObject({
      web: barList.optional(),
      horizontal: barList.optional(),
      ends: endBarList.optional(),
      ties: barList.optional(),
    })
    .optional(),
});
export type TypedSettings = z.infer<typeof typedSettingsSchema>;

/** PATCH of a building: any of the keys; null puts a key back to its default. `readSettingsPatch` applies it. */
export const settingsPatchSchema = z.partialRecord(z.enum(settingKeys()), z.unknown());
export type SettingsPatch = z.infer<typeof settingsPatchSchema>;

export type SettingsOutcome =
  | { readonly ok: true; readonly settings: Settings }
  | { readonly ok: false; readonly problems: readonly SettingProblem[] };

function settingKeys(): (keyof TypedSettings)[] {
  return Object.keys(typedSettingsSchema.shape) as (keyof TypedSettings)[];
}

const isObject = (value: unknown): value is Record<string, unknown> =>
  typeof value === 'object' && value !== null && !Array.isArray(value);

/** Values that mean a slip of units, in the building's own units: [least, most, unit]. */
const unitLimits: Readonly<Record<UnitSystem, Readonly<Record<string, readonly [number, number, string]>>>> = {
  us: { fc: [500, 30_000, 'psi'], fy: [20, 150, 'ksi'], fyt: [20, 150, 'ksi'], concreteWeight: [50, 300, 'pcf'] },
  si: { fc: [3, 210, 'MPa'], fy: [140, 1040, 'MPa'], fyt: [140, 1040, 'MPa'], concreteWeight: [8, 48, 'kN/m3'] },
};

/** What one cell of building.json can't tell: sizes against units, strengths that are in another unit, lists. */
function checkTogether(typed: Partial<TypedSettings>): SettingProblem[] {
  const problems: SettingProblem[] = [];
  const { units, basis, bars } = typed;
  if (basis && new Set(basis).size < basis.length) {
    problems.push({
      column: 'basis',
      message: `basis reads [${basis.join(', ')}], expected each basis once; take the second out`,
    });
  }
  if (basis && basis.every((entry) => entry === 'envelope')) {
    problems.push({
      column: 'basis',
      message: 'basis reads envelope alone, expected the bases it spans; name at least one beside it',
    });
  }
  if (!units) return problems;
  for (const [key, [least, most, unit]] of Object.entries(unitLimits[units])) {
    const value = typed[key as keyof TypedSettings];
    if (typeof value === 'number' && (value < least || value > most)) {
      problems.push({
        column: key,
        message: `${key} reads ${value}, expected ${least} to ${most} ${unit} in a building with units ${units}; convert it`,
      });
    }
  }
  for (const [use, list] of Object.entries(bars ?? {})) {
    const wrong = (list?.sizes ?? []).filter((size) => !barSizes[units].includes(size));
    if (wrong.length > 0) {
      problems.push({
        column: `bars.${use}.sizes`,
        message: `bars.${use}.sizes reads ${wrong.join(', ')}, expected bar numbers of units ${units}: ${barSizes[units].join(' ')}; correct them`,
      });
    }
    const [least, most, unit] = spacingLimits[units];
    const apart = (list?.spacings ?? []).filter((spacing) => spacing < least || spacing > most);
    if (apart.length > 0) {
      problems.push({
        column: `bars.${use}.spacings`,
        message: `bars.${use}.spacings reads ${apart.join(', ')}, expected ${least} to ${most} ${unit} in a building with units ${units}; correct them`,
      });
    }
  }
  return problems;
}

function unknownKeyProblems(path: readonly PropertyKey[], keys: readonly string[]): SettingProblem[] {
  let shape: readonly string[] = settingKeys();
  if (path[0] === 'stiffness') shape = ['flexure', 'shear', 'end', 'unitWeight'];
  if (path[0] === 'bars') shape = path.length === 1 ? ['web', 'horizontal', 'ends', 'ties'] : ['sizes', 'spacings'];
  return keys.map((key) => {
    const column = [...path, key].join('.');
    const near = nearestName(key, shape);
    const remedy = near === null ? `take it out or use one of ${shape.join(', ')}` : `${near} may be meant`;
    return { column, message: `${column} is no setting of building.json; ${remedy}` };
  });
}

/** Typed settings with the defaults of their units filled in; `given` names what was typed, nested keys by path. */
function fillSettings(typed: TypedSettings): Settings {
  const defaults = settingsDefaults(typed.units, typed.code);
  const { stiffness, bars, sdc, driftLimit, ...plain } = typed;
  const given = Object.entries(plain).flatMap(([key, value]) => (value === undefined ? [] : [key]));
  if (sdc) given.push('sdc');
  if (driftLimit) given.push('driftLimit');
  for (const [key, value] of Object.entries(stiffness ?? {}))
    if (value !== undefined && value !== null) given.push(`stiffness.${key}`);
  for (const [use, list] of Object.entries(bars ?? {})) {
    for (const [key, value] of Object.entries(list ?? {})) if (value !== undefined) given.push(`bars.${use}.${key}`);
  }
  const ascending = (values: readonly number[]): number[] => [...new Set(values)].sort((a, b) => a - b);
  const list = (use: keyof Settings['bars']): Settings['bars']['web'] => ({
    sizes: ascending(bars?.[use]?.sizes ?? defaults.bars[use].sizes),
    spacings: ascending(bars?.[use]?.spacings ?? defaults.bars[use].spacings),
  });
  return {
    ...defaults,
    ...Object.fromEntries(Object.entries(plain).filter(([, value]) => value !== undefined)),
    stiffness: { ...defaults.stiffness, ...stiffness },
    sdc: sdc ?? null,
    driftLimit: driftLimit ?? null,
    bars: { web: list('web'), horizontal: list('horizontal'), ends: list('ends'), ties: list('ties') },
    given,
  };
}

/** building.json, parsed, to complete settings or to all of its problems. */
export function readSettings(json: unknown): SettingsOutcome {
  if (!isObject(json)) {
    return {
      ok: false,
      problems: [
        {
          column: null,
          message: 'building.json holds no object, expected {"name": ..., "units": "us" or "si", ...}; write one',
        },
      ],
    };
  }
  const parsed = typedSettingsSchema.safeParse(json);
  const problems: SettingProblem[] = [];
  let typed: Partial<TypedSettings> | undefined = parsed.data;
  if (!parsed.success) {
    for (const issue of parsed.error.issues) {
      if (issue.code === 'unrecognized_keys') problems.push(...unknownKeyProblems(issue.path, issue.keys));
      else {
        // length limits complain once more of what is no list at all
        const column = issue.path.join('.');
        const told = problems.some((problem) => problem.column === column);
        if (!told) problems.push({ column, message: settingsMessage(issue, json) });
      }
    }
    // what stands besides the faulty keys is still read, so that all problems come at once
    const faulty = new Set(parsed.error.issues.flatMap((issue) => issue.path.slice(0, 1).map(String)));
    const rest = Object.fromEntries(
      Object.entries(json).filter(([key]) => Object.hasOwn(typedSettingsSchema.shape, key) && !faulty.has(key)),
    );
    typed = typedSettingsSchema.partial().safeParse(rest).data;
  }
  if (typed) {
    problems.push(...checkTogether(typed));
    const broken = new Set(problems.map((problem) => problem.column));
    const whole = fillSettings({ ...typed, name: typed.name ?? '', units: typed.units ?? 'us' });
    problems.push(...notDesignedYet(whole).filter((problem) => !broken.has(problem.column)));
    if (problems.length === 0) return { ok: true, settings: whole };
  }
  const keys: readonly string[] = settingKeys();
  const place = ({ column }: SettingProblem): number => {
    const at = keys.indexOf((column ?? '').split('.', 1)[0] ?? '');
    return at === -1 ? keys.length : at;
  };
  return { ok: false, problems: problems.sort((a, b) => place(a) - place(b)) };
}

/** The typed settings only, as building.json holds them: `readSettings(typedSettings(s))` gives `s` again. */
export function typedSettings(settings: Settings): Record<string, unknown> {
  const typed: Record<string, unknown> = {};
  for (const path of settings.given) {
    const parts = path.split('.');
    let value: unknown = settings;
    let target = typed;
    parts.forEach((part, index) => {
      value = isObject(value) ? value[part] : undefined;
      if (index === parts.length - 1) target[part] = value;
      else {
        const inner = target[part];
        target = isObject(inner) ? inner : (target[part] = {});
      }
    });
  }
  return typed;
}

/**
 * A patch upon settings, under the same rules: a key replaces, null puts back to the default; inside `stiffness` and `bars` only
 * the keys that are named change.
 */
export function readSettingsPatch(current: Settings, patch: unknown): SettingsOutcome {
  if (!isObject(patch)) return readSettings(patch);
  return readSettings(mergeTyped(typedSettings(current), patch, 0));
}

function mergeTyped(
  base: Record<string, unknown>,
  patch: Record<string, unknown>,
  depth: number,
): Record<string, unknown> {
  const merged = new Map(Object.entries(base));
  for (const [key, value] of Object.entries(patch)) {
    const inner = merged.get(key);
    const nested = depth > 0 || key === 'stiffness' || key === 'bars';
    if (value === null) merged.delete(key);
    else
      merged.set(key, nested && isObject(value) ? mergeTyped(isObject(inner) ? inner : {}, value, depth + 1) : value);
  }
  return Object.fromEntries(merged);
}
