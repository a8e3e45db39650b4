import type { BuildingInput, Warning } from '../engineering/input.ts';

/** What an engineer has settled, with the facts as they stood then. */
export interface Acknowledged {
  readonly code: string;
  readonly level: string | null;
  readonly wall: string | null;
  readonly factsHash: string;
}

/**
 * A short name for the facts behind a warning: its sentence with its figures, the wall's rows, the level's row. It moves when they move;
 * an acknowledgment lapses then. Equal on page and server.
 */
export function factsHash({ tables }: BuildingInput, { code, level, wall, message }: Warning): string {
  const walls = wall === undefined ? [] : tables.walls.filter((row) => row.wall === wall).map(wallFacts);
  const levels = tables.levels
    .filter((row) => row.level === level)
    .map(({ level: name, height, elevation, x, y, extent_x, extent_y, edge_x, edge_y, diaphragm }) => [
      name,
      height,
      elevation,
      x,
      y,
      extent_x,
      extent_y,
      edge_x,
      edge_y,
      diaphragm,
    ]);
  return hashText(JSON.stringify([code, level ?? null, wall ?? null, message, walls, levels]));
}

const wallFacts = (row: BuildingInput['tables']['walls'][number]): readonly unknown[] => [
  row.wall,
  row.x1,
  row.y1,
  row.x2,
  row.y2,
  row.thickness,
  row.from_level,
  row.to_level,
  row.fc,
  row.opening,
  row.flexure_factor,
  row.shear_factor,
];

/** FNV-1a over UTF-16 units, four times with different starts: 128 bits in hexadecimal. No secret hangs on it. */
function hashText(text: string): string {
  return [0x811c9dc5, 0x01000193, 0x9e3779b9, 0x85ebca6b]
    .map((start) => {
      let hash = start;
      for (let at = 0; at < text.length; at += 1) {
        hash ^= text.charCodeAt(at);
        hash = Math.imul(hash, 0x01000193);
        hash ^= hash >>> 15;
      }
      return (hash >>> 0).toString(16).padStart(8, '0');
    })
    .join('');
}

/** Warnings with `settled` where an acknowledgment names them and their facts still stand. */
export function settleWarnings(
  input: BuildingInput,
  warnings: readonly Warning[],
  acknowledged: readonly Acknowledged[],
): Warning[] {
  if (acknowledged.length === 0) return [...warnings];
  return warnings.map((warning): Warning => {
    const named = acknowledged.filter(
      ({ code, level, wall }) =>
        code === warning.code && level === (warning.level ?? null) && wall === (warning.wall ?? null),
    );
    if (named.length === 0) return warning;
    const facts = factsHash(input, warning);
    return named.some((one) => one.factsHash === facts) ? { ...warning, settled: true } : warning;
  });
}
