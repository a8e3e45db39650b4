import type { LateralAction } from '../distribution/lateralActions.ts';
import type { ModelSettings } from '../model/model.ts';

/** One way in which W, E or H acts: lateral actions with their factors. */
export interface LateralState {
  readonly label: string;
  readonly parts: readonly { readonly action: number; readonly factor: number }[];
}

const signs = [1, -1] as const;
const signText = (sign: number): string => (sign > 0 ? '+' : '−');

/** What decides the states: the actions' cases, directions and variants, not their forces. */
export type StateAction = Pick<LateralAction, 'caseIndex' | 'case' | 'kind' | 'direction' | 'variant'>;
export type StateSettings = Pick<ModelSettings, 'windCases' | 'orthogonal' | 'strengthFactor'>;

/** Indices of a case's actions by variant. */
type ByVariant = Readonly<Partial<Record<LateralAction['variant'], number>>>;

interface CaseActions {
  readonly name: string;
  readonly direction: 'x' | 'y';
  readonly by: ByVariant;
}

function casesOf(actions: readonly StateAction[], kind: LateralAction['kind']): CaseActions[] {
  const cases = new Map<number, { name: string; direction: 'x' | 'y'; by: Partial<Record<string, number>> }>();
  actions.forEach((action, index) => {
    if (action.kind !== kind) return;
    const found = cases.get(action.caseIndex) ?? { name: action.case, direction: action.direction, by: {} };
    found.by[action.variant] = index;
    cases.set(action.caseIndex, found);
  });
  return [...cases.values()];
}

/**
 * Wind: every case both ways; with `windCases` also Cases 2 to 4 of ASCE/SEI 7 Fig. 27.3-8: 0.75 with torsion at e = 0.15 of each level's
 * own extent, 0.75 of every x case with every y case, 0.563 of both with torsion; all signs. `eccentric` false (flexible): no torsion.
 */
export function windStates(
  actions: readonly StateAction[],
  settings: StateSettings,
  eccentric: boolean,
): LateralState[] {
  const cases = casesOf(actions, 'wind');
  const strength = settings.strengthFactor.wind;
  const part = (one: CaseActions, factor: number) => ({ action: one.by['0'] ?? 0, factor: factor * strength });
  const turn = (one: CaseActions, factor: number) =>
    one.by.torsion === undefined ? [] : [{ action: one.by.torsion, factor: factor * 0.15 * strength }];
  const states = cases.flatMap((one) =>
    signs.map((sign) => ({ label: `W = ${signText(sign)}${one.name}`, parts: [part(one, sign)] })),
  );
  if (!settings.windCases) return states;
  const senses = eccentric ? signs : ([0] as const);
  const at = (sense: number) => (sense === 0 ? '' : ` at ${signText(sense)}e`);
  for (const one of cases) {
    for (const sign of signs) {
      for (const sense of senses) {
        states.push({
          label: `W = ${signText(sign)}0.75${one.name}${at(sense)}`,
          parts: [part(one, 0.75 * sign), ...turn(one, 0.75 * sense)],
        });
      }
    }
  }
  const pairs = cases
    .filter(({ direction }) => direction === 'x')
    .flatMap((x) => cases.filter(({ direction }) => direction === 'y').map((y) => [x, y] as const));
  for (const [x, y] of pairs) {
    for (const signX of signs) {
      for (const signY of signs) {
        states.push({
          label: `W = ${signText(signX)}0.75${x.name} ${signText(signY)} 0.75${y.name}`,
          parts: [part(x, 0.75 * signX), part(y, 0.75 * signY)],
        });
      }
    }
  }
  for (const [x, y] of pairs) {
    for (const signX of signs) {
      for (const signY of signs) {
        for (const senseX of senses) {
          for (const senseY of senses) {
            states.push({
              label: `W = ${signText(signX)}0.563${x.name}${at(senseX)} ${signText(signY)} 0.563${y.name}${at(senseY)}`,
              parts: [
                part(x, 0.563 * signX),
                part(y, 0.563 * signY),
                ...turn(x, 0.563 * senseX),
                ...turn(y, 0.563 * senseY),
              ],
            });
          }
        }
      }
    }
  }
  return states;
}

/**
 * Seismic: every case both ways, with accidental eccentricity as + and - only. With `orthogonal` 100 % of every case of one direction with
 * that part of every case of the other, both signs, both ways round; the eccentricity on the one part or the other, never both
 * (ASCE/SEI 7 12.5, 12.8.4.2). A case that finds none across it acts alone. `eccentric` false (flexible): variant 0 only.
 */
export function seismicStates(
  actions: readonly StateAction[],
  settings: StateSettings,
  eccentric: boolean,
): LateralState[] {
  const cases = casesOf(actions, 'seismic');
  const { orthogonal, strengthFactor } = settings;
  const strength = strengthFactor.seismic;
  const sensesOf = (one: CaseActions) =>
    eccentric && one.by['+'] !== undefined ? (['+', '-'] as const) : (['0'] as const);
  const at = (variant: string) => (variant === '0' ? '' : ` at ${variant === '+' ? '+' : '−'}e`);
  const part = (one: CaseActions, variant: '0' | '+' | '-', factor: number) => ({
    action: one.by[variant] ?? 0,
    factor: factor * strength,
  });
  const alone = (one: CaseActions): LateralState[] =>
    sensesOf(one).flatMap((variant) =>
      signs.map((sign) => ({
        label: `E = ${signText(sign)}${one.name}${at(variant)}`,
        parts: [part(one, variant, sign)],
      })),
    );
  if (orthogonal === 0) return cases.flatMap(alone);
  return cases.flatMap((main) => {
    const across = cases.filter(({ direction }) => direction !== main.direction);
    if (across.length === 0) return alone(main);
    return across.flatMap((other) => {
      const senses: (readonly ['0' | '+' | '-', '0' | '+' | '-'])[] =
        sensesOf(main).length === 2
          ? [
              ['+', '0'],
              ['-', '0'],
              ['0', '+'],
              ['0', '-'],
            ]
          : [['0', '0']];
      return senses.flatMap(([first, second]) =>
        signs.flatMap((signMain) =>
          signs.map((signOther) => ({
            label: `E = ${signText(signMain)}${main.name}${at(first)} ${signText(signOther)} ${String(orthogonal)}${other.name}${at(second)}`,
            parts: [part(main, first, signMain), part(other, second, signOther * orthogonal)],
          })),
        ),
      );
    });
  });
}

/** Each `other` case in turn is H, with its own sign. */
export function otherStates(actions: readonly StateAction[]): LateralState[] {
  return casesOf(actions, 'other').map(({ name, by }) => ({
    label: `H = ${name}`,
    parts: [{ action: by['0'] ?? 0, factor: 1 }],
  }));
}
