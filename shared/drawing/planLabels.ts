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
  readonly leaderFrom: PlanPoint | null;
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
): Omit<Candidate, 'leaderFrom'> {
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

/** Places where a label may stand, the best first: beyond the arrow at the upper third, along the wall, farther with a leader. */
function candidates(placed: PlacedWall, share: string | null, arrowed: boolean): Candidate[] {
  const { end1, end2, outward, length, thickness, wall } = placed;
  const inY = Math.abs(placed.along.y) > Math.abs(placed.along.x);
  const start = inY ? (end1.y <= end2.y ? end1 : end2) : end1.x <= end2.x ? end1 : end2;
  const other = start === end1 ? end2 : end1;
  const down = { x: (other.x - start.x) / length, y: (other.y - start.y) / length };
  const found: Candidate[] = [];
  const put = (along: number, sideSign: 1 | -1, off: number, leader: boolean): void => {
    const normal = { x: outward.x * sideSign, y: outward.y * sideSign };
    const foot = move(start, down, along);
    const anchor = move(foot, normal, thickness / 2 + off);
    const at = inY ? { x: anchor.x, y: anchor.y + 4 } : { x: anchor.x, y: normal.y < 0 ? anchor.y + 1 : anchor.y + 10 };
    const side = inY && normal.x < 0 ? 'left' : 'right';
    const set = setLabel(wall.name, share, inY, at, side);
    found.push({ ...set, leaderFrom: leader ? move(foot, normal, thickness / 2) : null });
  };
  const near = arrowed ? 18 : 9;
  const steps = inY
    ? [Math.min(length / 3, 18), 4, length * 0.5, length * 0.7, length - 22]
    : [0, length / 4, length / 2, length * 0.7, length - 60];
  for (const step of steps) put(Math.max(0, step), 1, near, false);
  for (const step of steps) put(Math.max(0, step), -1, 9, false);
  for (const off of [34, 50, 66, 82]) for (const sign of [1, -1] as const) put(length / 2, sign, off, true);
  return found;
}

/** The label with the least overlap that comes first; a share is dropped rather than written over, the mark never. */
function placeLabel(placed: PlacedWall, arrowed: boolean, taken: readonly LabelBox[], page: LabelBox): Candidate {
  const { share } = placed.wall;
  const shareText = share !== null && Math.abs(share) >= leastShare ? formatShare(Math.abs(share)) : null;
  const off = ({ box }: Candidate): number =>
    overlapArea(box, taken) +
    (box.left < page.left || box.right > page.right || box.top < page.top || box.bottom > page.bottom ? 1e4 : 0);
  const [first, ...others] = candidates(placed, shareText, arrowed);
  if (!first) throw new Error(`no place for the mark of ${placed.wall.name}`);
  let best = first;
  for (const candidate of [...others, ...candidates(placed, null, arrowed)]) {
    if (off(best) === 0) break;
    if (off(candidate) < off(best)) best = candidate;
  }
  return best;
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
    const { box, texts, leaderFrom } = placeLabel(placed, arrowed, taken, page);
    taken.push(
      boxAround(
        [
          { x: box.left, y: box.top },
          { x: box.right, y: box.bottom },
        ],
        1,
      ),
    );
    if (leaderFrom) {
      const toX = leaderFrom.x < box.left ? box.left - 3 : leaderFrom.x > box.right ? box.right + 3 : leaderFrom.x;
      const toY = leaderFrom.y < box.top ? box.top : leaderFrom.y > box.bottom ? box.bottom : box.top + 8;
      elements.push({
        shape: 'line',
        x1: round2(leaderFrom.x),
        y1: round2(leaderFrom.y),
        x2: round2(toX),
        y2: round2(toY),
        stroke: 'graphite',
        strokeWidth: 0.75,
      });
    }
    elements.push(...texts);
  }
  return elements;
}
