import type { ReactElement } from 'react';

import { formatRatio } from '#shared/format/ratio';

const perRatio = 67;
const longest = 84;

export interface RatioBarProps {
  /** null: nothing resists */
  ratio: number | null;
  /** a check fails, whatever the ratio */
  over: boolean;
  /** every check passes, but a person has to settle something first: there is no verdict that a bar could show */
  open?: boolean;
  /** check and story beneath, for example `shear L5` */
  note: string;
}

/** Ratio as a number with a thin bar and a tick at 1.00; over: hatched, and the word. Length is the scale, never color. */
export function RatioBar({ ratio, over, open = false, note }: RatioBarProps): ReactElement {
  const width = ratio === null ? longest : Math.min(longest, ratio * perRatio);
  const word = over ? 'over' : open ? 'not settled' : null;
  return (
    <div className={`gw-ratio ${over ? 'over' : open ? 'open' : ''}`}>
      <span className="v">{ratio === null ? '–' : formatRatio(ratio)}</span>
      {word === null ? null : <b>{word}</b>}
      {open && !over ? null : (
        <span className="bar" aria-hidden="true">
          <i style={{ width }} />
        </span>
      )}
      <em>{note}</em>
    </div>
  );
}
