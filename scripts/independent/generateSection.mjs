import { writeFileSync } from 'node:fs';

import { makeRandom } from './makeRandom.mjs';

/** An invented wall section from a seed, as a file of `takedown --section`: generateSection.mjs SEED FILE. */
export function generateSection(seed) {
  const random = makeRandom(seed + 7000);
  const between = (low, high, decimals = 2) => Number((low + (high - low) * random()).toFixed(decimals));
  const pick = (list) => list[Math.floor(random() * list.length)];
  const us = random() < 0.5;
  const lengthFt = between(4, 40);
  const thicknessIn = pick([8, 10, 12, 16, 24]);
  const size = (ft) => Number((us ? ft : ft * 0.3048).toFixed(3));
  const small = (inches) => (us ? inches : Math.round(inches * 25));
  const fcPsi = pick([3000, 4000, 5000, 7000, 10000, 12000]);
  const section = {
    units: us ? 'us' : 'si',
    fc: us ? fcPsi : Math.round(fcPsi * 0.0069),
    length: size(lengthFt),
    height: size(12),
    totalHeight: size(between(6, 150)),
    thickness: small(thicknessIn),
    horizontal: { curtains: 2, bar: us ? pick([4, 5]) : pick([13, 16]), spacing: small(pick([8, 12, 16])) },
  };
  if (random() < 0.3) section.lambda = 0.75;
  if (random() < 0.3) Object.assign(section, us ? { fy: 80, fyt: 80 } : { fy: 550, fyt: 550 });
  if (random() < 0.25) {
    const count = 2 + Math.floor(random() * 8);
    section.layers = Array.from({ length: count }, (_, i) => ({
      position: Number(((small(lengthFt * 12) * (i + 0.5 * random() + 0.2)) / count).toFixed(2)),
      area: us ? between(0.3, 6) : between(200, 4000, 0),
    }));
  } else {
    section.vertical = {
      curtains: pick([1, 2]),
      bar: us ? pick([4, 5, 6]) : pick([13, 16, 19]),
      spacing: small(pick([6, 12, 18])),
    };
    if (random() < 0.5) {
      section.ends = {
        bar: us ? pick([7, 9, 11]) : pick([22, 29, 36]),
        count: pick([4, 6, 8]),
        length: small(pick([14, 18])),
      };
    }
  }
  const squashKip = (0.85 * fcPsi * lengthFt * 12 * thicknessIn) / 1000;
  const force = us ? 1 : 4.4482;
  section.actions = [-0.03, -0.005, 0, 0.02, 0.08, 0.2, 0.35, 0.45, 0.6].map((part) => ({
    axial: Number((part * squashKip * force).toFixed(3)),
    moment: between(10, 5000),
    shear: between(5, 500),
  }));
  return section;
}

const [, script, seed, file] = process.argv;
if (script?.endsWith('generateSection.mjs') && file !== undefined) {
  writeFileSync(file, JSON.stringify(generateSection(Number(seed)), null, 2));
}
