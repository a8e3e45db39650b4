import type { Model, WallLine } from '../model/model.ts';
import { concreteModulusKsi } from '../rigidity/concreteModulus.ts';

/**
 * Lateral stiffness of a whole wall at its floors, kip/in, row-major `floors x floors` from the lowest floor up, rotations condensed
 * out. The wall is a vertical cantilever fixed at its base, each story a beam element with shear deformation: flexural rigidity
 * Ec x factor x t lw^3/12, shear rigidity G Ae/1.2 with G = 0.4 Ec (Timoshenko; element stiffness as in any textbook on matrix
 * analysis, for example Przemieniecki). `baseSpring` is a rotation spring at the base in kip-in/rad, null where the base is fixed.
 */
export function wallStiffness(model: Model, wall: WallLine, baseSpring: number | null): Float64Array {
  const floors = wall.segments.length;
  const condensed = new Float64Array(floors * floors);
  // tridiagonal blocks: vv, vt (row v, column t), tt; node 0 is the base when it may turn
  const nodes = floors + 1;
  const vv = { diagonal: new Float64Array(nodes), next: new Float64Array(nodes) };
  const tt = { diagonal: new Float64Array(nodes), next: new Float64Array(nodes) };
  const vt = { own: new Float64Array(nodes), next: new Float64Array(nodes), previous: new Float64Array(nodes) };
  wall.segments.forEach((segment, index) => {
    const h = model.stories[segment.story]?.heightIn ?? 0;
    const modulus = concreteModulusKsi(segment.fcPsi, model.settings.stiffnessWeightPcf);
    const { thicknessIn: t, lengthIn: l } = segment;
    const bending = (modulus * segment.flexureFactor * t * l * l * l) / 12;
    const shear = (0.4 * modulus * segment.shearFactor * t * l) / 1.2;
    const phi = (12 * bending) / (shear * h * h);
    const k = bending / (h * h * h * (1 + phi));
    const [lower, upper] = [index, index + 1];
    add(vv.diagonal, lower, 12 * k);
    add(vv.diagonal, upper, 12 * k);
    add(vv.next, lower, -12 * k);
    add(tt.diagonal, lower, (4 + phi) * h * h * k);
    add(tt.diagonal, upper, (4 + phi) * h * h * k);
    add(tt.next, lower, (2 - phi) * h * h * k);
    add(vt.own, lower, 6 * h * k);
    add(vt.own, upper, -6 * h * k);
    add(vt.next, lower, 6 * h * k);
    add(vt.previous, upper, -6 * h * k);
  });
  if (baseSpring !== null) add(tt.diagonal, 0, baseSpring);

  const first = baseSpring === null ? 1 : 0;
  const column = new Float64Array(nodes);
  for (let floor = 0; floor < floors; floor += 1) {
    const node = floor + 1;
    // rotations that follow a unit displacement of this floor: tt x = -(column of vt transposed)
    column.fill(0);
    column[node] = -(vt.own[node] ?? 0);
    column[node - 1] = -(vt.previous[node] ?? 0);
    if (node + 1 < nodes) column[node + 1] = -(vt.next[node] ?? 0);
    solveTridiagonal(tt.diagonal, tt.next, column, first);
    for (let other = 0; other < floors; other += 1) {
      const at = other + 1;
      let force = (vt.own[at] ?? 0) * (column[at] ?? 0);
      if (at - 1 >= first) force += (vt.previous[at] ?? 0) * (column[at - 1] ?? 0);
      if (at + 1 < nodes) force += (vt.next[at] ?? 0) * (column[at + 1] ?? 0);
      if (at === node) force += vv.diagonal[node] ?? 0;
      else if (at === node - 1) force += vv.next[at] ?? 0;
      else if (at === node + 1) force += vv.next[node] ?? 0;
      condensed[other * floors + floor] = force;
    }
  }
  return symmetric(condensed, floors);
}

/** Solves a symmetric tridiagonal system in place from node `first` up, by elimination without pivoting (it is positive definite). */
function solveTridiagonal(diagonal: Float64Array, next: Float64Array, right: Float64Array, first: number): void {
  const count = diagonal.length;
  const pivots = new Float64Array(count);
  pivots[first] = diagonal[first] ?? 0;
  if (first === 1) right[0] = 0;
  for (let node = first + 1; node < count; node += 1) {
    const factor = (next[node - 1] ?? 0) / (pivots[node - 1] ?? 1);
    pivots[node] = (diagonal[node] ?? 0) - factor * (next[node - 1] ?? 0);
    right[node] = (right[node] ?? 0) - factor * (right[node - 1] ?? 0);
  }
  for (let node = count - 1; node >= first; node -= 1) {
    const above = node + 1 < count ? (next[node] ?? 0) * (right[node + 1] ?? 0) : 0;
    right[node] = ((right[node] ?? 0) - above) / (pivots[node] ?? 1);
  }
}

function symmetric(matrix: Float64Array, size: number): Float64Array {
  for (let row = 0; row < size; row += 1) {
    for (let column = row + 1; column < size; column += 1) {
      const mean = ((matrix[row * size + column] ?? 0) + (matrix[column * size + row] ?? 0)) / 2;
      matrix[row * size + column] = mean;
      matrix[column * size + row] = mean;
    }
  }
  return matrix;
}

function add(column: Float64Array, index: number, value: number) {
  column[index] = (column[index] ?? 0) + value;
}
