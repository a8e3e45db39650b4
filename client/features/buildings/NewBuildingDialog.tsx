import { useEffect, useId, useRef, useState, type SubmitEvent } from 'react';

import { sentenceOf } from '../../app/errorSentences.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Segments } from '../../components/ui/Segments.tsx';
import { useCreateBuilding } from '../../data/mutations.ts';

export interface NewBuildingDialogProps {
  readonly onClose: () => void;
  readonly onCreated: (id: string) => void;
}

const unitSystems = [
  { value: 'us', text: 'US: ft, in, kip, psi' },
  { value: 'si', text: 'SI: m, mm, kN, MPa' },
] as const;

/** Name, number and units; all else has defaults and is changed under Settings. */
export function NewBuildingDialog({ onClose, onCreated }: NewBuildingDialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const [name, setName] = useState('');
  const [number, setNumber] = useState('');
  const [units, setUnits] = useState<'us' | 'si'>('us');
  const [blank, setBlank] = useState(false);
  const create = useCreateBuilding();
  /** a second click of a double click comes before the page has drawn the first */
  const sending = useRef(false);
  const titleId = useId();
  const problemId = useId();

  useEffect(() => {
    const element = dialog.current;
    if (element === null) return undefined;
    element.showModal();
    return () => element.close();
  }, []);

  const submit = (event: SubmitEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (sending.current) return;
    if (name.trim() === '') {
      setBlank(true);
      return;
    }
    const body = { name: name.trim(), units, ...(number.trim() === '' ? {} : { number: number.trim() }) };
    sending.current = true;
    create.mutate(body, {
      onSuccess: (building) => onCreated(building.id),
      onSettled: () => {
        sending.current = false;
      },
    });
  };
  const problem = blank
    ? 'Name is blank, expected the name of the building.'
    : create.error === null
      ? null
      : (create.error.problems[0]?.message ?? sentenceOf(create.error));

  return (
    <dialog
      ref={dialog}
      className="gw-dialog"
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
    >
      <form noValidate onSubmit={submit}>
        <h2 id={titleId} className="gw-section mb-4">
          New building
        </h2>
        <label className="gw-label">
          Name
          <input
            className="gw-input mt-1"
            autoFocus
            maxLength={200}
            aria-invalid={blank}
            aria-describedby={problem === null ? undefined : problemId}
            value={name}
            onChange={(event) => {
              setName(event.target.value);
              setBlank(false);
            }}
          />
        </label>
        <label className="gw-label mt-4">
          Number<small>optional</small>
          <input
            className="gw-input mt-1"
            maxLength={100}
            value={number}
            onChange={(event) => setNumber(event.target.value)}
          />
        </label>
        <div className="gw-label mt-4 mb-1">
          Units<small>fixed once a table has rows</small>
        </div>
        <Segments label="Units" options={unitSystems} value={units} onChoose={setUnits} />
        <dl className="mt-4 grid grid-cols-[auto_1fr] gap-x-4">
          <dt className="text-graphite">Code</dt>
          <dd>ACI 318-19</dd>
        </dl>
        {problem === null ? null : (
          <p id={problemId} className="gw-problem mt-3" role="alert">
            {problem}
          </p>
        )}
        <div className="mt-5 flex gap-2">
          <Button look="primary" type="submit" aria-disabled={create.isPending}>
            Create building
          </Button>
          <Button onClick={onClose}>Leave it</Button>
        </div>
      </form>
    </dialog>
  );
}
