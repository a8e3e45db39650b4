import { inch, psi } from './siUnits.mjs';

/** Bar areas of ASTM A615 (in2) and of its soft-metric twins (mm2); from memory. */
const usAreas = { 3: 0.11, 4: 0.2, 5: 0.31, 6: 0.44, 7: 0.6, 8: 0.79, 9: 1, 10: 1.27, 11: 1.56, 14: 2.25, 18: 4 };
const siAreas = { 10: 71, 13: 129, 16: 199, 19: 284, 22: 387, 25: 510, 29: 645, 32: 819, 36: 1006, 43: 1452, 57: 2581 };
export const barArea = (bar, system) => (system === 'us' ? usAreas[bar] * inch ** 2 : siAreas[bar] * 1e-6);

const steelModulus = 29e6 * psi;
const crushing = 0.003;

/** Bars of a schedule row at their places from one wall end: engineering.md section 6, `Bars of a row`. */
export function layBars(row, segment, system, edge) {
  const length = segment.length;
  const unit = system === 'us' ? inch : 1e-3;
  const bars = [];
  let inner = edge;
  if (row.ends !== null) {
    const columns = row.ends.count / 2;
    const run = row.ends.length * unit - 2 * edge;
    const area = 2 * barArea(row.ends.bar, system);
    for (let i = 0; i < columns; i += 1) {
      const at = columns === 1 ? edge : edge + (run * i) / (columns - 1);
      bars.push({ at, area, end: true }, { at: length - at, area, end: true });
      inner = Math.max(inner, at);
    }
  }
  const web = row.vertical.curtains * barArea(row.vertical.bar, system);
  const run = length - 2 * inner;
  const spaces = Math.ceil(run / (row.vertical.spacing * unit) - 1e-9);
  const [first, last] = row.ends === null ? [0, spaces] : [1, spaces - 1];
  for (let i = first; i <= last; i += 1) bars.push({ at: inner + (run * i) / spaces, area: web, end: false });
  return { bars, webSpacing: run / spaces };
}

/** beta1 of 22.2.2.4.3. */
const blockFactor = ({ fc }) => Math.min(0.85, Math.max(0.65, 0.85 - 0.05 * (fc / psi / 1000 - 4)));

/**
 * Force and moment of a section at neutral-axis depth c, and phi by the farthest bar: rectangular block, bars one by one,
 * moments about mid-length. `compressed.end` and `.web` false: such bars carry nothing in compression. Bars act up to `fy`,
 * phi goes by `gradeFy`, the specified strength (318-19: 0.65 at yield to 0.90 at yield + 0.003).
 */
export function atDepth(section, c) {
  const { segment, bars, fy, compressed, gradeFy = fy } = section;
  const { length, thickness, fc } = segment;
  const beta = blockFactor(segment);
  const block = Math.min(length, beta * c);
  let force = 0.85 * fc * thickness * block;
  let moment = force * (length / 2 - block / 2);
  let farthest = 0;
  for (const { at, area, end } of bars) {
    farthest = Math.max(farthest, at);
    const strain = (crushing * (c - at)) / c;
    let stress = Math.max(-fy, Math.min(fy, steelModulus * strain));
    if (strain > 0 && !(end ? compressed.end : compressed.web)) stress = 0;
    else if (at < beta * c) stress -= 0.85 * fc;
    force += stress * area;
    moment += stress * area * (length / 2 - at);
  }
  const tension = (crushing * (farthest - c)) / c;
  const yieldStrain = gradeFy / steelModulus;
  const phi = Math.min(0.9, Math.max(0.65, 0.65 + (0.25 * (tension - yieldStrain)) / 0.003));
  return { c, phi, force, moment };
}

/**
 * All depths at which the section carries an axial force, reduced by phi (`design`) or not. The force falls by a step where
 * the block reaches a bar, which then loses 0.85 f'c: both sides of each step are scanned, and the step itself is no solution.
 */
export function makeDepths(section, design) {
  const { segment } = section;
  const steps = 3000;
  const forceAt = (c) => {
    const { phi, force } = atDepth(section, c);
    return design ? phi * force : force;
  };
  const even = Array.from({ length: steps + 1 }, (_, i) => segment.length * 1e-5 * 10 ** ((6.3 * i) / steps));
  const sides = section.bars.flatMap(({ at }) =>
    [at * (1 - 1e-12), at * (1 + 1e-12)].map((a) => a / blockFactor(segment)),
  );
  const depths = [...even, ...sides].sort((a, b) => a - b);
  const forces = depths.map(forceAt);
  const largest = forces.reduce((most, force) => Math.max(most, Math.abs(force)), 0);
  return (axial) => {
    const found = [];
    for (let i = 0; i + 1 < depths.length; i += 1) {
      if (forces[i] > axial === forces[i + 1] > axial) continue;
      let [low, high] = [depths[i], depths[i + 1]];
      const rising = forces[i + 1] > forces[i];
      for (let pass = 0; pass < 60; pass += 1) {
        const middle = (low + high) / 2;
        if (forceAt(middle) > axial === rising) high = middle;
        else low = middle;
      }
      const middle = (low + high) / 2;
      if (Math.abs(forceAt(middle) - axial) <= 1e-7 * largest) found.push(atDepth(section, middle));
    }
    return found;
  };
}

/** The point of smallest phi Mn at Pu among all depths that carry it; null outside the axial range. */
export function makeFlexurePoint(section) {
  const { segment, bars, fy, compressed } = section;
  const gross = segment.length * segment.thickness;
  const steel = bars.reduce((sum, { area }) => sum + area, 0);
  const counted = bars.reduce((sum, { area, end }) => ((end ? compressed.end : compressed.web) ? sum + area : sum), 0);
  const largest = 0.65 * 0.8 * (0.85 * segment.fc * (gross - counted) + fy * counted);
  const least = -0.9 * steel * fy;
  const depthsOf = makeDepths(section, true);
  const known = new Map();
  return (axial) => {
    if (axial > largest || axial < least) return null;
    if (!known.has(axial)) {
      const points = depthsOf(axial).sort((a, b) => a.phi * a.moment - b.phi * b.moment);
      known.set(axial, points[0] ?? null);
    }
    return known.get(axial);
  };
}

/** phi Mn at Pu alone. */
export function makeFlexure(section) {
  const pointOf = makeFlexurePoint(section);
  return (axial) => {
    const point = pointOf(axial);
    return point === null ? null : point.phi * point.moment;
  };
}

/** alpha_c of 11.5.4.3, with net tension by 11.5.4.4. */
export function alphaC(segment, wallHeight, axial) {
  const slender = wallHeight / segment.length;
  const gross = segment.length * segment.thickness;
  if (axial < 0) return Math.max(0, 2 * (1 + axial / (500 * psi * gross)));
  return Math.min(3, Math.max(2, 3 - (slender - 1.5) / 0.5));
}

/** phi Vn of an ordinary wall, 318-19 11.5.4.3, with the limit of 11.5.4.2; fyt and sqrt(f'c) capped. */
export function shearStrength(segment, wallHeight, axial, horizontalRatio, settings) {
  const root = Math.min(100, Math.sqrt(segment.fc / psi)) * psi;
  const area = segment.length * segment.thickness;
  const fyt = Math.min(settings.fyt, 60000 * psi);
  const alpha = alphaC(segment, wallHeight, axial);
  const strength = (alpha * settings.lambda * root + horizontalRatio * fyt) * area;
  return 0.75 * Math.min(strength, 8 * root * area);
}
