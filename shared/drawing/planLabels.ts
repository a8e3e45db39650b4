import { formatShare } from '../format/force.ts';
import type { DrawingElement, TextElement } from './elements.ts';
import { boxAround, overlapArea, type LabelBox } from './labelBoxes.ts';
import { move, type PlacedWall } from './planWall.ts';
import type { PlanPoint } from './planTypes.ts';
import { round2 } from './round2.ts';
import { textWidth } from './textWidth.ts';

const leastShare = 0.005;
const markSize = 13;
const shareSize = 12;
const gap = 7;
const lineHeight = 16;

interface Candidate {
  readonly box: LabelBox;
  readonly texts: readonly TextElement[];
  readonly leader: Leader | null;
}

interface Leader {
  readonly from: PlanPoint;
  readonly to: PlanPoint;
}

const halo = (element: Omit<TextElement, 'shape' | 'fill' | 'halo'>): TextElement => ({
  shape: 'text',
  fill: 'ink',
  halo: 'sheet',
  ...element,
});

/** Mark and share one above the other (walls in y), or beside each other (walls in x), with their left end at `left`. */
function setLabel(
  name: string,
  share: string | null,
  stacked: boolean,
  at: PlanPoint,
  side: 'left' | 'right',
): Omit<Candidate, 'leader'> {
  const markWidth = textWidth(name, markSize, 500);
  const shareWidth = share === null ? 0 : textWidth(share, shareSize);
  const width = stacked ? Math.max(markWidth, shareWidth) : markWidth + (share === null ? 0 : gap + shareWidth);
  const left = side === 'right' ? at.x : at.x - width;
  const height = stacked && share !== null ? lineHeight * 2 : lineHeight;
  const box = { left, right: left + width, top: at.y - 12, bottom: at.y - 12 + height };
  const y = round2(at.y);
  if (!stacked) {
    const mark = halo({ x: round2(left), y, text: name, size: markSize, weight: 500 });
    if (share === null) return { box, texts: [mark] };
    return { box, texts: [mark, halo({ x: round2(left + markWidth + gap), y, text: share, size: shareSize })] };
  }
  const anchor = side === 'right' ? 'start' : 'end';
  const x = round2(at.x);
  const mark = halo({ x, y, text: name, size: markSize, weight: 500, anchor });
  if (share === null) return { box, texts: [mark] };
  return { box, texts: [mark, halo({ x, y: y + lineHeight, text: share, size: shareSize, anchor })] };
}

/** From the face of the wall to the nearest edge of the label. */
function leaderTo(box: LabelBox, from: PlanPoint): Leader {
  const x = from.x < box.left ? box.left - 3 : from.x > box.right ? box.right + 3 : from.x;
  const y = from.y < box.top ? box.top : from.y > box.bottom ? box.bottom : box.top + 8;
  return { from, to: { x, y } };
}

/**
 * Places where a label may stand, the best first: beyond the arrow at the upper third, along the wall, on its other side, past its
 * ends, farther off with a leader.
 */
function candidates(placed: PlacedWall, share: string | null, arrowed: boolean): Candidate[] {
  const { end1, end2, outward, length, thickness, wall } = placed;
  const inY = Math.abs(placed.along.y) > Math.abs(placed.along.x);
  const start = inY ? (end1.y <= end2.y ? end1 : end2) : end1.x <= end2.x ? end1 : end2;
  const other = start === end1 ? end2 : end1;
  const down = { x: (other.x - start.x) / length, y: (other.y - start.y) / length };
  const found: Candidate[] = [];
  const put = (along: number, sideSign: 1 | -1, off: number, leads: boolean): void => {
    const normal = { x: outward.x * sideSign, y: outward.y * sideSign };
    const foot = move(start, down, along);
    const anchor = move(foot, normal, thickness / 2 + off);
    const at = inY ? { x: anchor.x, y: anchor.y + 4 } : { x: anchor.x, y: normal.y < 0 ? anchor.y + 1 : anchor.y + 10 };
    const side = inY && normal.x < 0 ? 'left' : 'right';
    const set = setLabel(wall.name, share, inY, at, side);
    found.push({ ...set, leader: leads ? leaderTo(set.box, move(foot, normal, thickness / 2 + 3)) : null });
  };
  const past = (end: PlanPoint, sense: 1 | -1): void => {
    const at = move(end, down, sense * 8);
    const beside = { x: at.x, y: at.y + (inY ? (sense > 0 ? 12 : 0) : 4) };
    const set = setLabel(wall.name, share, false, beside, inY || sense > 0 ? 'right' : 'left');
    const shift = inY ? (set.box.left - set.box.right) / 2 : 0;
    found.push({
      box: { ...set.box, left: set.box.left + shift, right: set.box.right + shift },
      texts: set.texts.map((text) => ({ ...text, x: round2(text.x + shift) })),
      leader: null,
    });
  };
  const near = arrowed ? (inY ? 18 : 20) : 9;
  const steps = inY
    ? [Math.min(length / 3, 18), 4, length * 0.5, length * 0.7, length - 22]
    : [0, length / 4, length / 2, length * 0.7, length - 60];
  for (const step of steps) put(Math.max(0, step), 1, near, false);
  for (const step of steps) put(Math.max(0, step), -1, 8, false);
  past(other, 1);
  past(start, -1);
  for (const off of [34, 50, 66, 82]) for (const sign of [1, -1] as const) put(length / 2, sign, off, true);
  return found;
}

const sharelessCost = 80;

/** px2 written over by a label and its leader; a place outside of the page costs more than any other. */
function overlapCost({ box, leader }: Candidate, taken: readonly LabelBox[], page: LabelBox): number {
  const outside = box.left < page.left || box.right > page.right || box.top < page.top || box.bottom > page.bottom;
  const crossed = leader ? overlapArea(boxAround([leader.from, leader.to], 0.5), taken) : 0;
  return overlapArea(box, taken) + crossed + (outside ? 1e4 : 0);
}

/** The first label with the least overlap; a share is dropped rather than written over, the mark never. */
function placeLabel(placed: PlacedWall, arrowed: boolean, taken: readonly LabelBox[], page: LabelBox): Candidate {
  const { share } = placed.wall;
  const shareText = share !== null && Math.abs(share) >= leastShare ? formatShare(Math.abs(share)) : null;
  const all = [
    ...candidates(placed, shareText, arrowed).map((candidate) => ({ candidate, extra: 0 })),
    ...candidates(placed, null, arrowed).map((candidate) => ({ candidate, extra: sharelessCost })),
  ];
  let best: { candidate: Candidate; cost: number } | null = null;
  for (const { candidate, extra } of all) {
    const cost = overlapCost(candidate, taken, page) + extra;
    if (best === null || cost < best.cost) best = { candidate, cost };
    if (best.cost === 0) break;
  }
  if (best === null) throw new Error(`no place for the mark of ${placed.wall.name}`);
  return best.candidate;
}

/** Labels in the order of their shares, each kept apart from what is taken before it. */
export function drawPlanLabels(
  placedWalls: readonly { readonly placed: PlacedWall; readonly arrowed: boolean }[],
  obstacles: readonly LabelBox[],
  page: LabelBox,
): DrawingElement[] {
  const taken = [...obstacles];
  const order = [...placedWalls].sort(
    (a, b) => Math.abs(b.placed.wall.share ?? 0) - Math.abs(a.placed.wall.share ?? 0),
  );
  const elements: DrawingElement[] = [];
  for (const { placed, arrowed } of order) {
    const { box, texts, leader } = placeLabel(placed, arrowed, taken, page);
    taken.push(
      boxAround(
        [
          { x: box.left, y: box.top },
          { x: box.right, y: box.bottom },
        ],
        1,
      ),
    );
    if (leader) {
      elements.push({
        shape: 'line',
        x1: round2(leader.from.x),
        y1: round2(leader.from.y),
        x2: round2(leader.to.x),
        y2: round2(leader.to.y),
        stroke: 'graphite',
        strokeWidth: 0.75,
      });
    }
    elements.push(...texts);
  }
  return elements;
}
