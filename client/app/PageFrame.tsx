import type { ReactNode } from 'react';

import { Foot, type KeyHint } from './Foot.tsx';
import { useTitleBlock } from './useTitleBlock.ts';

export interface PageFrameProps {
  readonly title: string;
  readonly sub?: ReactNode;
  /** at most one primary button, at the right end */
  readonly actions?: ReactNode;
  /** name of the story or band that is chosen, above the stack */
  readonly stackTitle?: ReactNode;
  readonly stackSub?: ReactNode;
  /** the figure in the left column; it brings its own caption */
  readonly stack?: ReactNode;
  /** up to four key hints in the foot */
  readonly keys?: readonly KeyHint[];
  /** false as long as levels, walls or forces are missing: then there is no balance to ask for */
  readonly computes?: boolean;
  readonly children: ReactNode;
}

/** The frame of a building page: head and drawing field beside the stack column, the balance and the caution in the foot. */
export function PageFrame({
  title,
  sub,
  actions,
  stackTitle,
  stackSub,
  stack,
  keys = [],
  computes = true,
  children,
}: PageFrameProps) {
  useTitleBlock(title);
  return (
    <>
      <aside className="contents" aria-label="Stories">
        <div className="gw-stack-head">
          <p className="gw-page-name">{stackTitle}</p>
          <p className="gw-sub">{stackSub}</p>
        </div>
        <div className="gw-stack-column">{stack}</div>
      </aside>
      <main className="contents">
        <div className="gw-head">
          <div className="min-w-0">
            <h1 className="gw-page-name">{title}</h1>
            <div className="gw-sub">{sub}</div>
          </div>
          <div className="gw-acts">{actions}</div>
        </div>
        <div className="gw-sheet">{children}</div>
      </main>
      <Foot keys={keys} balance={computes ? 'ask' : 'wait'} />
    </>
  );
}
