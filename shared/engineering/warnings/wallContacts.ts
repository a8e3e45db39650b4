import type { Model, WallSegment } from '../model/model.ts';

/** sin(0.5 degree): walls closer than this in direction are parallel; one line within 1 in (engineering.md section 1). */
const parallelSine = 0.008726535498373935;
const oneLineIn = 1;
/** 1/16 in: what the geometry of a plan is good for */
const drawnIn = 1 / 16;
const twelveFeetIn = 144;

/** Two walls of one story that are not the separate rectangles they are computed as. */
export interface WallContact {
  readonly a: number;
  readonly b: number;
  /** `meet`: an end of one within the other's thickness, or the two cross; `gap`: on one line with a short clear gap */
  readonly kind: 'meet' | 'gap';
  /** clear gap, in; 0 where they meet */
  readonly gapIn: number;
  readonly xIn: number;
  readonly yIn: number;
}

/** Contacts between the walls of a story, each pair once. */
export function wallContacts(model: Model, story: number): WallContact[] {
  const standing = model.walls.flatMap((wall, index) => {
    const segment = wall.segments[story - wall.fromStory];
    return segment ? [{ index, segment }] : [];
  });
  return standing.flatMap((a, place) =>
    standing.slice(place + 1).flatMap((b): WallContact[] => {
      const pair = { a: a.index, b: b.index };
      if (onOneLine(a.segment, b.segment)) {
        const gap = clearGap(a.segment, b.segment);
        const limit = Math.max(a.segment.lengthIn, b.segment.lengthIn, twelveFeetIn);
        if (gap.gapIn > limit || standing.some((c) => c !== a && c !== b && fills(c.segment, a.segment, gap)))
          return [];
        return [{ ...pair, kind: 'gap', ...gap }];
      }
      const at = endWithin(a.segment, b.segment) ?? endWithin(b.segment, a.segment) ?? crossing(a.segment, b.segment);
      return at === null ? [] : [{ ...pair, kind: 'meet', gapIn: 0, ...at }];
    }),
  );
}

export function parallel(a: WallSegment, b: WallSegment): boolean {
  return Math.abs(a.cos * b.sin - a.sin * b.cos) <= parallelSine;
}

function onOneLine(a: WallSegment, b: WallSegment): boolean {
  const across = (b.centroidXIn - a.centroidXIn) * a.sin - (b.centroidYIn - a.centroidYIn) * a.cos;
  return parallel(a, b) && Math.abs(across) <= oneLineIn;
}

/** Clear gap between two walls on one line, and its middle; 0 where they touch or overlap. */
function clearGap(a: WallSegment, b: WallSegment): Pick<WallContact, 'gapIn' | 'xIn' | 'yIn'> {
  const along = (b.centroidXIn - a.centroidXIn) * a.cos + (b.centroidYIn - a.centroidYIn) * a.sin;
  const gapIn = Math.max(0, Math.abs(along) - (a.lengthIn + b.lengthIn) / 2);
  const reach = (along < 0 ? -1 : 1) * (a.lengthIn / 2 + gapIn / 2);
  return { gapIn, xIn: a.centroidXIn + reach * a.cos, yIn: a.centroidYIn + reach * a.sin };
}

/** Whether a third wall on the line stands in the gap. */
function fills(c: WallSegment, a: WallSegment, gap: Pick<WallContact, 'gapIn' | 'xIn' | 'yIn'>): boolean {
  if (!onOneLine(a, c)) return false;
  const along = Math.abs((c.centroidXIn - gap.xIn) * a.cos + (c.centroidYIn - gap.yIn) * a.sin);
  return along < gap.gapIn / 2 + c.lengthIn / 2 && gap.gapIn > 0;
}

/** Where two walls cross between their ends; null where they do not. */
function crossing(a: WallSegment, b: WallSegment): Pick<WallContact, 'xIn' | 'yIn'> | null {
  const sine = a.cos * b.sin - a.sin * b.cos;
  if (Math.abs(sine) <= parallelSine) return null;
  const dx = b.centroidXIn - a.centroidXIn;
  const dy = b.centroidYIn - a.centroidYIn;
  const alongA = (dx * b.sin - dy * b.cos) / sine;
  const alongB = (dx * a.sin - dy * a.cos) / sine;
  if (Math.abs(alongA) > a.lengthIn / 2 || Math.abs(alongB) > b.lengthIn / 2) return null;
  return { xIn: a.centroidXIn + alongA * a.cos, yIn: a.centroidYIn + alongA * a.sin };
}

/** The end of `a` that lies within the thickness of `b`, corners included; null where none does. */
function endWithin(a: WallSegment, b: WallSegment): Pick<WallContact, 'xIn' | 'yIn'> | null {
  const ends = [
    { xIn: a.x1In, yIn: a.y1In },
    { xIn: a.x2In, yIn: a.y2In },
  ];
  const found = ends.find(({ xIn, yIn }) => {
    const along = (xIn - b.centroidXIn) * b.cos + (yIn - b.centroidYIn) * b.sin;
    const across = (xIn - b.centroidXIn) * b.sin - (yIn - b.centroidYIn) * b.cos;
    // at a corner the center line may end at the other wall's far face
    return (
      Math.abs(across) <= b.thicknessIn / 2 + drawnIn && Math.abs(along) <= (b.lengthIn + a.thicknessIn) / 2 + drawnIn
    );
  });
  return found ?? null;
}
