import type { Bar } from './bars.ts';
import { findBar } from './bars.ts';
import { barLayers } from './barLayers.ts';
import type { CompressionZones, WallBars } from './barLayers.ts';
import type { DesignContext } from './designContext.ts';
import type { LapCell, ScheduleCells } from './designTypes.ts';
import { designStrength } from './flexuralStrength.ts';
import type { FlexuralState } from './flexuralStrength.ts';
import { sectionCurve } from './sectionCurve.ts';
import type { WallSection } from './sectionCurve.ts';

export interface HorizontalBars {
  readonly curtains: 1 | 2;
  readonly bar: Bar;
  readonly spacingIn: number;
}

export interface LapsInInches {
  readonly webIn: number | null;
  readonly endsIn: number | null;
  readonly horizontalIn: number | null;
  readonly splice: LapCell['splice'];
}

/** Design strength by axial force, each solved once. */
export type StrengthAt = (axialKip: number) => FlexuralState | null;

/** Cells of a row in engine units. */
export interface Reinforcement {
  readonly bars: WallBars;
  readonly horizontal: HorizontalBars;
  readonly ties: null | { readonly bar: Bar; readonly spacingIn: number };
  readonly laps: LapsInInches;
}

/** The web and end bars of a row in engine units. */
export function wallBars(cells: Pick<ScheduleCells, 'vertical' | 'ends'>, context: DesignContext): WallBars {
  const { units, limits, edgeIn } = context;
  const { vertical, ends } = cells;
  return {
    curtains: vertical.curtains,
    web: findBar(units, vertical.bar),
    webSpacingIn: vertical.spacing * limits.toIn,
    ends: ends && { bar: findBar(units, ends.bar), count: ends.count, lengthIn: ends.length * limits.toIn },
    edgeIn,
  };
}

export function horizontalBars(cell: ScheduleCells['horizontal'], context: DesignContext): HorizontalBars {
  return {
    curtains: cell.curtains,
    bar: findBar(context.units, cell.bar),
    spacingIn: cell.spacing * context.limits.toIn,
  };
}

/** A row's cells read into engine units. */
export function readReinforcement(cells: ScheduleCells, context: DesignContext): Reinforcement {
  const { toIn } = context.limits;
  const inches = (length: number | null): number | null => (length === null ? null : length * toIn);
  return {
    bars: wallBars(cells, context),
    horizontal: horizontalBars(cells.horizontal, context),
    ties: cells.ties && { bar: findBar(context.units, cells.ties.bar), spacingIn: cells.ties.spacing * toIn },
    laps: {
      webIn: inches(cells.laps.web),
      endsIn: inches(cells.laps.ends),
      horizontalIn: inches(cells.laps.horizontal),
      splice: cells.laps.splice,
    },
  };
}

/**
 * Which bars may count in compression: those that ties hold (11.7.4.1, taken on the safe side: engineering.md section 6 lets bars
 * without ties count zero in compression whatever their amount). Ties stand around end zones only; web bars are never tied.
 */
export function compressionZones(bars: Pick<WallBars, 'ends'>, tied: boolean): CompressionZones {
  return { web: false, ends: tied && bars.ends !== null };
}

/** Strength of a section that remembers what it has solved. */
export function strengthOf(section: WallSection, context: DesignContext): StrengthAt {
  const curve = sectionCurve(section, context.rules);
  const solved = new Map<number, FlexuralState | null>();
  return (axialKip) => {
    let state = solved.get(axialKip);
    if (state === undefined) {
      state = designStrength(curve, axialKip);
      solved.set(axialKip, state);
    }
    return state;
  };
}

/** The section of a row's bars in concrete of given size. */
export function sectionOf(
  bars: WallBars,
  concrete: { readonly lengthIn: number; readonly thicknessIn: number; readonly fcPsi: number },
  zones: CompressionZones,
  context: DesignContext,
): WallSection {
  return {
    lengthIn: concrete.lengthIn,
    thicknessIn: concrete.thicknessIn,
    fcPsi: concrete.fcPsi,
    fyKsi: context.fyKsi,
    layers: barLayers(bars, concrete.lengthIn, zones),
  };
}
