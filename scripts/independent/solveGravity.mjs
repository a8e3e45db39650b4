export const gravityCases = { D: 'dead', L: 'live', Lr: 'rooflive', S: 'snow' };

/**
 * Axial and moment of every wall at every story bottom by gravity case. Loads of a level enter at the top of its story
 * with their eccentricity toward (x2, y2); self-weight of a story acts at its own centroid; where the centroid moves,
 * the axial from above gains a lever.
 */
export function solveGravity(building) {
  const { settings, stories } = building;
  const out = [];
  for (const wall of building.walls.values()) {
    for (const [name, column] of Object.entries(gravityCases)) {
      let axial = 0;
      let moment = 0;
      for (let i = wall.to; i >= wall.from; i -= 1) {
        const segment = wall.segments.get(i);
        const above = wall.segments.get(i + 1);
        if (above !== undefined) {
          const lever = (above.x - segment.x) * segment.c + (above.y - segment.y) * segment.s;
          moment += axial * lever;
        }
        for (const row of building.gravity) {
          if (row.wall !== wall.name || row.level !== stories[i].level) continue;
          axial += row[column] ?? 0;
          moment += (row[column] ?? 0) * (row.eccentricity ?? 0);
        }
        if (name === 'D' && settings.selfWeight) {
          const faceArea = segment.length * stories[i].height * (1 - segment.opening);
          axial += segment.thickness * faceArea * settings.concreteWeight;
        }
        out.push({ story: i, wall: wall.name, case: name, axial, moment, lowest: i === wall.from });
      }
    }
  }
  return out;
}
