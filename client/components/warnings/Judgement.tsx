import { useId, useState, type FormEvent, type ReactElement } from 'react';

import type { AcknowledgmentRow } from '#shared/contracts/acknowledgments';
import type { Warning } from '#shared/engineering/input';

import { sentenceOf } from '../../app/errorSentences.ts';
import { useAcknowledge } from '../../data/mutations.ts';
import { Button } from '../ui/Button.tsx';
import { sayWho } from './acknowledgmentOf.ts';

export interface JudgementProps {
  buildingId: string;
  warning: Warning;
  /** the last judgement on it */
  last: AcknowledgmentRow | null;
  canAccept: boolean;
}

/** What was judged of a warning, by whom and when; for engineers the way to accept it with a reason. A judgement lapses when the facts move. */
export function Judgement({ buildingId, warning, last, canAccept }: JudgementProps): ReactElement | null {
  const stands = warning.settled === true && last !== null;
  if (stands)
    return (
      <p className="mt-1 text-note">
        <b className="font-semibold">Accepted</b> by {sayWho(last)}: {last.reason}
      </p>
    );
  return (
    <>
      {last === null ? null : (
        <p className="mt-1 text-note">
          <b className="font-semibold">Lapsed:</b> accepted by {sayWho(last)}: {last.reason}. The facts have moved
          since.
        </p>
      )}
      {canAccept ? <AcceptForm buildingId={buildingId} warning={warning} /> : null}
    </>
  );
}

function AcceptForm({ buildingId, warning }: Pick<JudgementProps, 'buildingId' | 'warning'>): ReactElement {
  const field = useId();
  const accept = useAcknowledge(buildingId);
  const [open, setOpen] = useState(false);
  const [reason, setReason] = useState('');
  const onSubmit = (event: FormEvent): void => {
    event.preventDefault();
    const text = reason.trim();
    if (text === '') return;
    accept.mutate({ code: warning.code, level: warning.level ?? null, wall: warning.wall ?? null, reason: text });
  };
  if (!open)
    return (
      <Button look="text" className="-ml-[6px] h-[24px]! text-data!" onClick={() => setOpen(true)}>
        Accept, because
      </Button>
    );
  return (
    <form className="mt-1 flex flex-wrap items-end gap-2" onSubmit={onSubmit}>
      <label className="min-w-[280px] flex-1 text-note" htmlFor={field}>
        Reason, as it should stand in the calculation
        <input
          id={field}
          className="gw-input gw-input-low"
          value={reason}
          maxLength={2000}
          autoFocus
          onChange={(event) => setReason(event.target.value)}
        />
      </label>
      <Button type="submit" className="h-[28px]!" disabled={reason.trim() === '' || accept.isPending}>
        Accept, because
      </Button>
      <Button look="text" className="h-[28px]!" onClick={() => setOpen(false)}>
        Leave it open
      </Button>
      {accept.error === null ? null : (
        <p className="gw-problem w-full text-note" role="alert">
          {sentenceOf(accept.error)}
        </p>
      )}
    </form>
  );
}
