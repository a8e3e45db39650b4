import type { Model } from '../model/model.ts';
import { millimetersPerInch } from '../units.ts';

/** sin(0.5 degree): walls closer than this to an axis are parallel to it. */
const parallelSine = 0.008726535498373935;

/** Walls of a story that take a level's force in one direction, with their parts of it; they add up to 1. */
export type Fractions = ReadonlyMap<number, number>;

interface Line {
  at: number;
  readonly walls: { readonly index: number; readonly k: number; readonly at: number }[];
}

/**
 * Parts of a level's force in `direction` by tributary width (engineering.md section 3.2): walls parallel to it form lines; the floor
 * spans between lines as simple spans under a load uniform over its extent; an overhang adds its width to the outermost line, without a
 * lever; within a line by rigidity. `free` are the walls without a share. Null where no such wall stands.
 */
export function tributaryFractions(
  model: Model,
  rigidities: Float64Array,
  story: number,
  direction: 'x' | 'y',
  free: ReadonlySet<number>,
): Fractions | null {
  const level = model.stories[story];
  if (!level) return null;
  const tolerance = model.settings.units === 'si' ? 25 / millimetersPerInch : 1;
  const candidates = model.walls.flatMap((wall, index) => {
    const segment = wall.segments[story - wall.fromStory];
    if (!segment || !free.has(index)) return [];
    const off = direction === 'x' ? segment.sin : segment.cos;
    if (Math.abs(off) > parallelSine) return [];
    const at = direction === 'x' ? segment.centroidYIn : segment.centroidXIn;
    return [{ index, at, k: rigidities[story * model.walls.length + index] ?? 0 }];
  });
  if (candidates.length === 0) return null;
  const lines: Line[] = [];
  for (const wall of candidates.sort((a, b) => a.at - b.at || a.index - b.index)) {
    const last = lines[lines.length - 1];
    const first = last?.walls[0];
    if (last && first && wall.at - first.at <= tolerance) last.walls.push(wall);
    else lines.push({ at: wall.at, walls: [wall] });
  }
  for (const line of lines) {
    const k = line.walls.reduce((sum, wall) => sum + wall.k, 0);
    line.at = line.walls.reduce((sum, wall) => sum + wall.k * wall.at, 0) / k;
  }
  const low = direction === 'x' ? level.edgeYIn : level.edgeXIn;
  const extent = direction === 'x' ? level.extentYIn : level.extentXIn;
  const reactions = lineReactions(
    lines.map(({ at }) => at),
    low,
    extent,
  );
  const fractions = new Map<number, number>();
  lines.forEach((line, index) => {
    const k = line.walls.reduce((sum, wall) => sum + wall.k, 0);
    for (const wall of line.walls) fractions.set(wall.index, ((reactions[index] ?? 0) * wall.k) / k);
  });
  return fractions;
}

/** Parts of a load uniform from `low` over `extent` that lines at given coordinates (rising) take; without an extent, equal parts. */
export function lineReactions(lines: readonly number[], low: number, extent: number): number[] {
  const reactions = lines.map(() => 0);
  const last = lines.length - 1;
  if (extent <= 0 || last === 0) return lines.map(() => 1 / lines.length);
  const high = low + extent;
  const add = (index: number, width: number) => {
    reactions[index] = (reactions[index] ?? 0) + width / extent;
  };
  const covered = (from: number, to: number) => Math.max(0, Math.min(to, high) - Math.max(from, low));
  add(0, covered(low, Math.min(lines[0] ?? 0, high)));
  add(last, covered(Math.max(lines[last] ?? 0, low), high));
  for (let span = 0; span < last; span += 1) {
    const from = lines[span] ?? 0;
    const to = lines[span + 1] ?? 0;
    const width = covered(from, to);
    if (width === 0) continue;
    const middle = (Math.max(from, low) + Math.min(to, high)) / 2;
    const far = (middle - from) / (to - from);
    add(span, width * (1 - far));
    add(span + 1, width * far);
  }
  return reactions;
}
