import { useId, useState, type SubmitEvent } from 'react';

import type { ForceRow, LevelRow } from '#shared/engineering/input';
import { formatNumber } from '#shared/format/number';

import { sentenceOf } from '../../app/errorSentences.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Section } from '../../components/ui/Section.tsx';
import { Segments } from '../../components/ui/Segments.tsx';
import { usePatchTable } from '../../data/mutations.ts';
import { storyForceRows, storyForces, type StoryForceDraft } from './storyForceRows.ts';

export interface StoryForceHelpProps {
  readonly buildingId: string;
  readonly units: 'us' | 'si';
  readonly forcesAre: 'level-force' | 'story-shear';
  readonly levels: readonly LevelRow[];
  readonly forces: readonly (ForceRow & { readonly id: string })[];
}

const empty: StoryForceDraft = { case: '', direction: 'x', baseShear: '', period: '' };

function Typed({
  label,
  value,
  problem,
  onType,
}: {
  readonly label: string;
  readonly value: string;
  readonly problem: string | null;
  readonly onType: (value: string) => void;
}) {
  const id = useId();
  return (
    <div>
      <label htmlFor={id} className="gw-label">
        {label}
      </label>
      <input
        id={id}
        className="gw-input gw-input-low w-[140px]!"
        value={value}
        aria-invalid={problem !== null}
        aria-describedby={problem === null ? undefined : `${id}-problem`}
        onChange={(event) => onType(event.target.value)}
      />
      {problem === null ? null : (
        <p id={`${id}-problem`} className="gw-problem mt-1" role="alert">
          {problem}
        </p>
      )}
    </div>
  );
}

/** Makes the rows of one seismic case from level weights, a base shear and a period; they are forces like any from then on. */
export function StoryForceHelp({ buildingId, units, forcesAre, levels, forces }: StoryForceHelpProps) {
  const [open, setOpen] = useState(false);
  const [draft, setDraft] = useState(empty);
  const [asked, setAsked] = useState(false);
  const patch = usePatchTable(buildingId, 'forces');
  const unit = units === 'us' ? 'kip' : 'kN';
  const answer = storyForces(draft, levels, [...new Set(forces.map((row) => row.case))]);
  const problemAt = (field: keyof StoryForceDraft | null): string | null =>
    asked && !answer.ok && answer.field === field ? answer.message : null;
  const type = (part: Partial<StoryForceDraft>) => setDraft((before) => ({ ...before, ...part }));

  if (!open) {
    return (
      <div className="mt-4">
        <Button onClick={() => setOpen(true)}>Story forces from weights</Button>
      </div>
    );
  }
  const submit = (event: SubmitEvent<HTMLFormElement>) => {
    event.preventDefault();
    setAsked(true);
    if (!answer.ok) return;
    const after = forces[forces.length - 1]?.id ?? null;
    const rows = storyForceRows(draft, answer.forces, forcesAre);
    patch.mutate(
      { inserts: rows.map((row) => ({ after, row })) },
      {
        onSuccess: () => {
          setDraft(empty);
          setAsked(false);
          setOpen(false);
        },
      },
    );
  };
  return (
    <form noValidate aria-label="Story forces from weights" className="mt-5" onSubmit={submit}>
      <Section title="Story forces from weights" aside="equivalent lateral force, ASCE/SEI 7 12.8.3">
        <div className="flex flex-wrap items-start gap-x-4 gap-y-2 py-2">
          <Typed
            label="Case"
            value={draft.case}
            problem={problemAt('case')}
            onType={(value) => type({ case: value })}
          />
          <div>
            <span className="gw-label">Direction</span>
            <Segments
              label="Direction"
              options={[
                { value: 'x', text: 'x' },
                { value: 'y', text: 'y' },
              ]}
              value={draft.direction}
              onChoose={(direction) => type({ direction })}
            />
          </div>
          <Typed
            label={`Base shear, ${unit}`}
            value={draft.baseShear}
            problem={problemAt('baseShear')}
            onType={(baseShear) => type({ baseShear })}
          />
          <Typed
            label="Period T, s"
            value={draft.period}
            problem={problemAt('period')}
            onType={(period) => type({ period })}
          />
        </div>
        {problemAt(null) === null ? null : (
          <p className="gw-problem mb-2 font-medium" role="alert">
            {problemAt(null)}
          </p>
        )}
        {answer.ok ? (
          <table className="gw-table" aria-label="Story forces">
            <thead>
              <tr>
                <th scope="col">Level</th>
                <th scope="col" className="num">
                  {`Force, ${unit}`}
                </th>
                <th scope="col" className="num">
                  {`Story shear, ${unit}`}
                </th>
              </tr>
            </thead>
            <tbody>
              {answer.forces.map(({ level, force, shear }) => (
                <tr key={level}>
                  <th scope="row">{level}</th>
                  <td className="num">{formatNumber(force, 1)}</td>
                  <td className="num">{formatNumber(shear, 1)}</td>
                </tr>
              ))}
            </tbody>
          </table>
        ) : null}
        <div className="mt-2 flex flex-wrap items-center gap-2">
          <Button look="primary" type="submit" disabled={patch.isPending}>
            Make the rows
          </Button>
          <Button onClick={() => setOpen(false)}>Leave</Button>
          <span className="note">
            {answer.ok
              ? `k ${answer.exponent.toFixed(2)}; the rows are stored as ${forcesAre === 'story-shear' ? 'story shears' : 'level forces'} and can be typed over.`
              : 'Forces of your own always win: a case that has rows keeps them.'}
          </span>
        </div>
        {patch.error === null ? null : (
          <p className="gw-problem mt-2 font-medium" role="alert">
            {patch.error.problems[0]?.message ?? sentenceOf(patch.error)}
          </p>
        )}
      </Section>
    </form>
  );
}
