import type { ReactElement } from 'react';

import { formatRatio } from '#shared/format/ratio';

const perRatio = 67;
const longest = 84;

export interface RatioBarProps {
  /** null: nothing resists */
  ratio: number | null;
  /** a check fails, whatever the ratio */
  over: boolean;
  /** check and story beneath, for example `shear L5` */
  note: string;
}

/** Ratio as a number with a thin bar and a tick at 1.00; over: hatched, and the word. Length is the scale, never color. */
export function RatioBar({ ratio, over, note }: RatioBarProps): ReactElement {
  const width = ratio === null ? longest : Math.min(longest, ratio * perRatio);
  return (
    <div className={`gw-ratio ${over ? 'over' : ''}`}>
      <span className="v">{ratio === null ? '–' : formatRatio(ratio)}</span>
      <span className="bar" aria-hidden="true">
        <i style={{ width }} />
      </span>
      <em>{over ? `over, ${note}` : note}</em>
    </div>
  );
}
