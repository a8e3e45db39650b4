import type { LateralAction } from '../distribution/lateralActions.ts';
import type { Model } from '../model/model.ts';

import { centroidShiftIn } from './centroidShift.ts';

/** What assigned transfers do to the walls, `[action * stories * walls + story * walls + wall]`, kip and kip-in. */
export interface TransferEffects {
  readonly shearKip: Float64Array;
  readonly axialKip: Float64Array;
  readonly momentKipIn: Float64Array;
}

/**
 * Transfers of overrides.csv: shear acts in the story of the level; axial and moment enter there and go down to the wall's base, the moment
 * gaining shear times height and, where the centroid moves, the axial from above times the shift (engineering.md section 4). They belong
 * to the case with its sign, in every basis and variant. Null where there is none.
 */
export function transferEffects(model: Model, actions: readonly LateralAction[]): TransferEffects | null {
  const transfers = model.overrides.filter(({ kind }) => kind === 'transfer');
  if (transfers.length === 0) return null;
  const walls = model.walls.length;
  const plane = model.stories.length * walls;
  const column = () => new Float64Array(actions.length * plane);
  const effects = { shearKip: column(), axialKip: column(), momentKipIn: column() };
  actions.forEach((action, index) => {
    if (action.variant === 'torsion') return;
    for (const transfer of transfers) {
      if (transfer.caseName !== null && transfer.caseName !== action.case) continue;
      const at = index * plane + transfer.story * walls + transfer.wallIndex;
      effects.shearKip[at] = (effects.shearKip[at] ?? 0) + transfer.shearKip;
      effects.axialKip[at] = (effects.axialKip[at] ?? 0) + transfer.axialKip;
      effects.momentKipIn[at] = (effects.momentKipIn[at] ?? 0) + transfer.momentKipIn;
    }
    model.walls.forEach((wall, wallIndex) => {
      let axial = 0;
      let moment = 0;
      for (let story = wall.toStory; story >= wall.fromStory; story -= 1) {
        const at = index * plane + story * walls + wallIndex;
        moment += axial * centroidShiftIn(wall, story);
        axial += effects.axialKip[at] ?? 0;
        moment += (effects.shearKip[at] ?? 0) * (model.stories[story]?.heightIn ?? 0) + (effects.momentKipIn[at] ?? 0);
        effects.axialKip[at] = axial;
        effects.momentKipIn[at] = moment;
      }
    });
  });
  return effects;
}
