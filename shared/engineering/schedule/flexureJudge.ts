import type { DesignContext } from '../wall-design/designContext.ts';
import type { WallBars } from '../wall-design/barLayers.ts';
import { compressionZones, sectionOf } from '../wall-design/reinforcement.ts';
import { designStrength } from '../wall-design/flexuralStrength.ts';
import { CurveStore, sectionCurve } from '../wall-design/sectionCurve.ts';
import { passes, ratioOf } from '../wall-design/plainCheck.ts';

import type { AxialMoment, BandNeeds } from './bandNeeds.ts';

/** Answers for one band whether bars are strong enough; the pair that failed last is asked first, since most candidates fail at it; answers are kept. */
export interface FlexureJudge {
  readonly fits: (bars: WallBars, tied: boolean) => boolean;
  /** worst |M|/phi Mn; Infinity where a pair has no capacity */
  readonly worstRatio: (bars: WallBars, tied: boolean) => number;
}

export function flexureJudge(needs: BandNeeds, context: DesignContext): FlexureJudge {
  const pairs: AxialMoment[] = [...needs.pairs];
  const store = new CurveStore();
  const solver = (bars: WallBars, tied: boolean): ((pair: AxialMoment) => number | null) => {
    const zones = compressionZones(bars, tied);
    const curve = sectionCurve(sectionOf(bars, needs, zones, context), context.rules, 1, store);
    return ({ axialKip, momentKipIn }) => ratioOf(momentKipIn, designStrength(curve, axialKip)?.phiMnKipIn ?? null);
  };
  const known = new Map<string, boolean>();
  const judged = (bars: WallBars, tied: boolean): boolean => {
    const ratio = solver(bars, tied);
    for (let index = 0; index < pairs.length; index += 1) {
      const pair = pairs[index] as AxialMoment;
      if (passes(ratio(pair))) continue;
      pairs.splice(index, 1);
      pairs.unshift(pair);
      return false;
    }
    return true;
  };
  return {
    fits: (bars, tied) => {
      const { ends } = bars;
      const zone = ends ? `${String(ends.bar.number)} ${String(ends.count)} ${String(ends.lengthIn)}` : '';
      const key = `${String(bars.curtains)} ${String(bars.web.number)} ${String(bars.webSpacingIn)} ${zone} ${String(tied)}`;
      let answer = known.get(key);
      if (answer === undefined) {
        answer = judged(bars, tied);
        known.set(key, answer);
      }
      return answer;
    },
    worstRatio: (bars, tied) => {
      const ratio = solver(bars, tied);
      return pairs.reduce((worst, pair) => Math.max(worst, ratio(pair) ?? Infinity), 0);
    },
  };
}
