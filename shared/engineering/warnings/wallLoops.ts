import type { WallContact } from './wallContacts.ts';

/** Contacts closer than this are one corner, in. */
const cornerIn = 18;

/**
 * Closed loops of walls in plan: walls and corners as a graph; what hangs by one corner only is taken off until loops are left. Gives the
 * walls of each loop, or of loops that share a wall or corner, by index and rising.
 */
export function wallLoops(contacts: readonly WallContact[]): number[][] {
  const corners: { readonly xIn: number; readonly yIn: number; readonly walls: Set<number> }[] = [];
  for (const { a, b, xIn, yIn } of contacts) {
    const known = corners.find(
      (corner) => Math.abs(corner.xIn - xIn) <= cornerIn && Math.abs(corner.yIn - yIn) <= cornerIn,
    );
    const corner = known ?? { xIn, yIn, walls: new Set<number>() };
    if (!known) corners.push(corner);
    corner.walls.add(a).add(b);
  }
  let trimmed = true;
  while (trimmed) {
    trimmed = false;
    const degree = new Map<number, number>();
    for (const { walls } of corners) for (const wall of walls) degree.set(wall, (degree.get(wall) ?? 0) + 1);
    for (const { walls } of corners) {
      for (const wall of [...walls]) {
        if (degree.get(wall) !== 1 && walls.size !== 1) continue;
        walls.delete(wall);
        trimmed = true;
      }
    }
  }
  const loops: Set<number>[] = [];
  for (const { walls } of corners) {
    if (walls.size === 0) continue;
    const touching = loops.filter((loop) => [...walls].some((wall) => loop.has(wall)));
    const joined = new Set([...touching.flatMap((loop) => [...loop]), ...walls]);
    for (const loop of touching) loops.splice(loops.indexOf(loop), 1);
    loops.push(joined);
  }
  return loops.map((loop) => [...loop].sort((one, other) => one - other));
}
