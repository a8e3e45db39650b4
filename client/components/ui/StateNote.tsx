import type { ReactNode } from 'react';

import { StateArt, type ArtName } from './StateArt.tsx';

export interface StateNoteProps {
  readonly art: ArtName;
  /** where this is and what state it is, for example `Inputs, no levels yet` */
  readonly place: string;
  readonly title: string;
  readonly children: ReactNode;
  readonly actions?: ReactNode;
  /** the page's own h1 stands elsewhere unless this is the whole page */
  readonly wholePage?: boolean;
}

/** Empty, computing, refused, forbidden: a drawing, what is so, and the way on. */
export function StateNote({ art, place, title, children, actions, wholePage = false }: StateNoteProps) {
  const Title = wholePage ? 'h1' : 'h2';
  return (
    <div className="flex flex-wrap items-center gap-6 py-6" role="status">
      <div className="flex w-[232px] justify-center self-start">
        <StateArt name={art} />
      </div>
      <div className="min-w-[280px] flex-1">
        <div className="note">{place}</div>
        <Title className="mt-[2px] mb-2 text-[22px] leading-[28px] font-semibold tracking-[-0.01em]">{title}</Title>
        <div className="flex max-w-[80ch] flex-col gap-2 [&>p]:max-w-[46ch]">{children}</div>
        {actions === undefined ? null : <div className="mt-4 flex flex-wrap gap-2">{actions}</div>}
      </div>
    </div>
  );
}
