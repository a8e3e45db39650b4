import type { BuildingInput, Warning } from '../engineering/input.ts';

/** What an engineer has settled, with the facts as they stood then. */
export interface Acknowledged {
  readonly code: string;
  readonly level: string | null;
  readonly wall: string | null;
  readonly factsHash: string;
}

/**
 * A short name for the facts behind the warnings of one code, level and wall: their sentences with their figures, the wall's rows, the
 * level's row. It moves when they move; an acknowledgment lapses then. Equal on page and server.
 */
export function factsHash({ tables }: BuildingInput, warnings: readonly Warning[]): string {
  const [first] = warnings;
  const walls = tables.walls.filter((row) => row.wall === first?.wall).map(wallFacts);
  const levels = tables.levels.filter((row) => row.level === first?.level).map(levelFacts);
  const messages = warnings.map(({ message }) => message);
  return hashText(JSON.stringify([first?.code, first?.level ?? null, first?.wall ?? null, messages, walls, levels]));
}

/** Warnings that one acknowledgment settles together: those of its code, level and wall. */
export function warningsNamed(
  warnings: readonly Warning[],
  { code, level, wall }: Pick<Acknowledged, 'code' | 'level' | 'wall'>,
): Warning[] {
  return warnings.filter(
    (warning) => warning.code === code && (warning.level ?? null) === level && (warning.wall ?? null) === wall,
  );
}

const levelFacts = (row: BuildingInput['tables']['levels'][number]): readonly unknown[] => [
  row.height,
  row.elevation,
  row.x,
  row.y,
  row.extent_x,
  row.extent_y,
  row.edge_x,
  row.edge_y,
  row.diaphragm,
];

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
  const settled = new Set<Warning>();
  for (const one of acknowledged) {
    const named = warningsNamed(warnings, one);
    if (named.length === 0 || factsHash(input, named) !== one.factsHash) continue;
    for (const warning of named) settled.add(warning);
  }
  return warnings.map((warning) => (settled.has(warning) ? { ...warning, settled: true } : warning));
}
