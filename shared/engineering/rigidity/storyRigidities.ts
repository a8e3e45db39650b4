import type { Model } from '../model/model.ts';

import { wallRigidityKipPerIn } from './wallRigidity.ts';

/** k in kip/in, `[story * walls + wall]`; 0 where the wall does not stand. */
export function storyRigidities(model: Model): Float64Array {
  const { stories, walls, settings } = model;
  const rigidities = new Float64Array(stories.length * walls.length);
  walls.forEach((wall, wallIndex) => {
    for (const segment of wall.segments) {
      rigidities[segment.story * walls.length + wallIndex] = wallRigidityKipPerIn({
        heightIn: stories[segment.story]?.heightIn ?? 0,
        lengthIn: segment.lengthIn,
        thicknessIn: segment.thicknessIn,
        fcPsi: segment.fcPsi,
        flexureFactor: segment.flexureFactor,
        shearFactor: segment.shearFactor,
        endFactor: settings.endFactor,
        unitWeightPcf: settings.stiffnessWeightPcf,
      });
    }
  });
  return rigidities;
}
