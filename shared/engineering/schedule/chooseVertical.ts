import type { BarLists } from '../input.ts';
import { webCount } from '../wall-design/barLayers.ts';
import type { WallBars } from '../wall-design/barLayers.ts';
import type { DesignContext } from '../wall-design/designContext.ts';
import type { HorizontalBars } from '../wall-design/reinforcement.ts';
import { wallBars } from '../wall-design/reinforcement.ts';
import { lapNeeded } from '../wall-design/rowLaps.ts';

import type { BandNeeds } from './bandNeeds.ts';
import type { CellsAbove } from './choosing.ts';
import { lightest, score } from './choosing.ts';
import { endLadder, endSizes } from './endChoices.ts';
import type { EndsCell } from './endChoices.ts';
import type { FlexureJudge } from './flexureJudge.ts';
import { verticalMass } from './rowMass.ts';
import { webLadders } from './webChoices.ts';
import type { VerticalCell } from './webChoices.ts';

export interface VerticalChoice {
  readonly vertical: VerticalCell;
  readonly ends: EndsCell | null;
  /** end-zone bars are needed in compression and must be tied */
  readonly tied: boolean;
}

interface Candidate {
  readonly vertical: VerticalCell;
  readonly ends: EndsCell | null;
  readonly bars: WallBars;
  readonly score: number;
}

/** An arrangement without end zones is taken up to this much above the best one with them: fewer shapes to place (our choice). */
const plainWebAllowance = 1.1;

export interface VerticalQuestion {
  readonly needs: BandNeeds;
  /** of these needs; kept from round to round */
  readonly judge: FlexureJudge;
  readonly lists: BarLists;
  /** horizontal bars of the last round; they set cover, fit and the bracket of 11.6.2 */
  readonly horizontal: HorizontalBars;
  readonly above: CellsAbove | null;
  readonly used: ReadonlySet<number>;
  /** cells that the engineer has set */
  readonly fixed: { readonly vertical?: VerticalCell; readonly ends?: EndsCell | null };
  readonly context: DesignContext;
}

/** All vertical steel through a section, in2. */
export function verticalSteel(bars: WallBars, lengthIn: number): number {
  const endsIn2 = bars.ends ? 2 * bars.ends.count * bars.ends.bar.areaIn2 : 0;
  return webCount(bars, lengthIn) * bars.curtains * bars.web.areaIn2 + endsIn2;
}

/**
 * Vertical steel of a band: the lowest score (mass with laps, 2 % per new bar size) among web cells alone and web cells with end
 * zones that carry every pair of Pu and Mu, give the joints their steel and leave nothing lighter than above. With end zones the
 * lightest web cell of each size is tried. Where nothing passes, the strongest arrangement, which the checks then mark as over.
 */
export function chooseVertical(question: VerticalQuestion): VerticalChoice {
  const { needs, judge, lists, horizontal, above, used, fixed, context } = question;
  const candidate = (vertical: VerticalCell, ends: EndsCell | null): Candidate => {
    const bars = wallBars({ vertical, ends }, context);
    const laps = {
      webIn: lapNeeded('web', bars, horizontal, needs.fcPsi, context),
      endsIn: ends && lapNeeded('ends', bars, horizontal, needs.fcPsi, context),
    };
    const massLb = verticalMass(bars, needs.lengthIn, needs.heightsIn, laps);
    return { vertical, ends, bars, score: score(massLb, ends ? [vertical.bar, ends.bar] : [vertical.bar], used) };
  };
  const steelEnough = (bars: WallBars): boolean =>
    verticalSteel(bars, needs.lengthIn) >= needs.jointSteelIn2 * (1 - 1e-9);
  const accept = ({ bars }: Candidate): boolean =>
    steelEnough(bars) && (judge.fits(bars, false) || (bars.ends !== null && judge.fits(bars, true)));
  const finish = ({ vertical, ends, bars }: Candidate): VerticalChoice => ({
    vertical,
    ends,
    tied: ends !== null && !judge.fits(bars, false),
  });

  const webs = (relaxed: boolean): VerticalCell[][] =>
    webLadders(needs, lists, horizontal, above?.vertical ?? null, context, relaxed);
  let webOptions = fixed.vertical ? [[fixed.vertical]] : webs(false);
  if (webOptions.length === 0) webOptions = webs(true);

  const aboveEnds = above?.ends ?? null;
  const plain =
    fixed.ends || (fixed.ends === undefined && aboveEnds)
      ? []
      : webOptions.map((ladder) => ladder.map((vertical) => candidate(vertical, null)));
  const bestPlain = lightest(plain, accept);
  const least = Math.min(...plain.map((ladder) => (ladder[0] as Candidate).score));
  if (bestPlain && (fixed.ends === null || bestPlain.score <= least * plainWebAllowance)) return finish(bestPlain);

  const endCandidates = (more: boolean): Candidate[][] => {
    if (fixed.ends === null) return [];
    if (fixed.ends) {
      const { ends } = fixed;
      return webOptions.map((ladder) => ladder.map((vertical) => candidate(vertical, ends)));
    }
    const found: Candidate[][] = [];
    for (const ladder of webOptions) {
      const vertical = ladder[0] as VerticalCell;
      const heaviest = ladder[ladder.length - 1] as VerticalCell;
      for (const size of endSizes(lists, aboveEnds)) {
        const cells = endLadder(needs, size, vertical, horizontal, aboveEnds, context, more);
        const most = cells[cells.length - 1];
        if (!most) continue;
        found.push(cells.map((cell) => candidate(vertical, cell)));
        if (more) found.push([candidate(heaviest, most)]);
      }
    }
    if (found.length > 0 || !aboveEnds) return found;
    return webOptions.map((ladder) => ladder.map((vertical) => candidate(vertical, aboveEnds)));
  };
  let withEnds = endCandidates(false);
  let bestEnds = lightest(withEnds, accept);
  if (!bestEnds && !bestPlain) {
    withEnds = endCandidates(true);
    bestEnds = lightest(withEnds, accept);
  }
  if (bestPlain && (!bestEnds || bestPlain.score <= bestEnds.score * plainWebAllowance)) return finish(bestPlain);
  if (bestEnds) return finish(bestEnds);
  return finish(
    strongest([...plain, ...withEnds], ({ bars }) =>
      Math.max(judge.worstRatio(bars, bars.ends !== null), needs.jointSteelIn2 / verticalSteel(bars, needs.lengthIn)),
    ),
  );
}

/**
 * The last rung of each ladder is its strongest; the one least over wins, the lighter at equal ratios. Where an axial force is outside
 * of every arrangement's limits no ratio tells them apart, and the heaviest wins.
 */
function strongest(ladders: readonly (readonly Candidate[])[], ratioOf: (candidate: Candidate) => number): Candidate {
  let best: Candidate | null = null;
  let bestRatio = Infinity;
  for (const ladder of ladders) {
    const last = ladder[ladder.length - 1] as Candidate;
    const ratio = ratioOf(last);
    const lighter = best !== null && last.score < best.score;
    if (best === null || ratio < bestRatio || (ratio === bestRatio && lighter === ratio < Infinity)) {
      best = last;
      bestRatio = ratio;
    }
  }
  if (best === null) throw new Error('no vertical bars to choose from: the bar lists are empty');
  return best;
}
