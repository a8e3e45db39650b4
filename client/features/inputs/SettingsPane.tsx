import { useId, useState, type SubmitEvent } from 'react';

import type { BuildingResource } from '#shared/contracts/buildings';
import type { ApiProblem } from '#shared/contracts/errors';

import { sentenceOf } from '../../app/errorSentences.ts';
import { Button } from '../../components/ui/Button.tsx';
import { Segments } from '../../components/ui/Segments.tsx';
import { usePatchBuilding, type BuildingPatch } from '../../data/mutations.ts';
import { draftOf, putAt, readDraft, valueAt } from './settingDraft.ts';
import { fieldUnit, settingGroups, type SettingField } from './settingFields.ts';

export interface SettingsPaneProps {
  readonly building: BuildingResource;
  readonly canEdit: boolean;
  /** or not known yet: units can't change then */
  readonly hasRows: boolean;
  /** cases of the forces table, for the base shears expected */
  readonly cases: readonly string[];
}

const switchChoices = [
  { value: 'yes', text: 'Yes' },
  { value: 'no', text: 'No' },
];

function Field({
  field,
  units,
  draft,
  disabled,
  problem,
  onDraft,
}: {
  readonly field: SettingField;
  readonly units: 'us' | 'si';
  readonly draft: string;
  readonly disabled: boolean;
  readonly problem: string | null;
  readonly onDraft: (draft: string) => void;
}) {
  const id = useId();
  const unit = fieldUnit(field, units);
  const aside = [unit, field.note ?? ''].filter((part) => part !== '').join(', ');
  const choices = field.kind === 'switch' ? switchChoices : field.choices;
  const label = (
    <>
      {field.label}
      {aside === '' ? null : <small>{aside}</small>}
    </>
  );
  const wide = field.kind === 'list' || field.kind === 'text';
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-x-3 border-t border-rule py-1 first:border-t-0">
      {choices === undefined ? (
        <label htmlFor={id} className="gw-label">
          {label}
        </label>
      ) : (
        <span className="gw-label">{label}</span>
      )}
      {choices === undefined ? (
        <input
          id={id}
          className={`gw-input gw-input-low ${wide ? 'w-[220px]!' : 'w-[112px]! text-right'} ${field.kind === 'list' ? 'mono' : ''}`}
          value={draft}
          disabled={disabled}
          aria-invalid={problem !== null}
          aria-describedby={problem === null ? undefined : `${id}-problem`}
          onChange={(event) => onDraft(event.target.value)}
        />
      ) : choices.length > 3 ? (
        <select
          className="gw-input gw-input-low w-[112px]!"
          aria-label={field.label}
          value={draft}
          disabled={disabled}
          onChange={(event) => onDraft(event.target.value)}
        >
          {choices.map((choice) => (
            <option key={choice.value} value={choice.value}>
              {choice.text}
            </option>
          ))}
        </select>
      ) : (
        <Segments label={field.label} options={choices} value={draft} disabled={disabled} onChoose={onDraft} />
      )}
      {problem === null ? null : (
        <p id={`${id}-problem`} className="gw-problem col-span-2 mt-1" role="alert">
          {problem}
        </p>
      )}
    </div>
  );
}

const problemAt = (problems: readonly ApiProblem[], path: string): string | null =>
  problems.find((problem) => problem.column === path || problem.column?.startsWith(`${path}.`) === true)?.message ??
  null;

/** building.json as a form: what is built, in groups, with units; a blank field takes its default. */
export function SettingsPane({ building, canEdit, hasRows, cases }: SettingsPaneProps) {
  const patch = usePatchBuilding(building.id);
  const [drafts, setDrafts] = useState<Readonly<Record<string, string>>>({});
  const [wrong, setWrong] = useState<Readonly<Record<string, string>>>({});
  const shearFields: readonly SettingField[] = cases.map((name) => ({
    path: `expectedBaseShear.${name}`,
    label: name,
    kind: 'number',
    quantity: 'force',
  }));
  const groups = [
    ...settingGroups,
    ...(shearFields.length === 0 ? [] : [{ title: 'Base shear of your load sheet', fields: shearFields }]),
  ];
  const stored = (field: SettingField) => {
    const record = field.path.startsWith('expectedBaseShear.')
      ? building.expectedBaseShear[field.path.slice('expectedBaseShear.'.length)]
      : valueAt(building, field.path);
    return draftOf(record);
  };
  const draftFor = (field: SettingField) => drafts[field.path] ?? stored(field);
  const changed = groups.flatMap((group) => group.fields.filter((field) => draftFor(field) !== stored(field)));
  const problems = patch.error?.problems ?? [];
  const placed = groups.some((group) => group.fields.some((field) => problemAt(problems, field.path) !== null));

  const submit = (event: SubmitEvent<HTMLFormElement>) => {
    event.preventDefault();
    const body: Record<string, unknown> = { version: building.version };
    const faults: Record<string, string> = {};
    const shears: Record<string, unknown> = { ...building.expectedBaseShear };
    let shearsChanged = false;
    for (const field of changed) {
      const read = readDraft(field, draftFor(field));
      if (!read.ok) faults[field.path] = `read ${draftFor(field)}, expected ${read.expected}`;
      else if (field.path.startsWith('expectedBaseShear.')) {
        shearsChanged = true;
        const name = field.path.slice('expectedBaseShear.'.length);
        if (read.value === null) Reflect.deleteProperty(shears, name);
        else shears[name] = read.value;
      } else putAt(body, field.path, read.value);
    }
    setWrong(faults);
    if (Object.keys(faults).length > 0) return;
    if (shearsChanged) body.expectedBaseShear = shears;
    patch.mutate(body as BuildingPatch, { onSuccess: () => setDrafts({}) });
  };

  return (
    <form noValidate aria-label="Settings" onSubmit={submit} className="pt-3">
      <div className="mb-3 flex min-h-[32px] items-center gap-2">
        {canEdit ? (
          <>
            <Button look="primary" type="submit" disabled={changed.length === 0 || patch.isPending}>
              Save settings
            </Button>
            <Button
              disabled={changed.length === 0}
              onClick={() => {
                setDrafts({});
                setWrong({});
                patch.reset();
              }}
            >
              Put back
            </Button>
            <span className="note" role="status">
              {changed.length > 0
                ? `${changed.length === 1 ? '1 field' : `${changed.length} fields`} changed, not saved`
                : patch.isSuccess
                  ? 'Saved; the figures follow.'
                  : ''}
            </span>
          </>
        ) : (
          <span className="gw-tag text-graphite">read only for your role</span>
        )}
        <span className="note ml-auto">Code ACI 318-19, ordinary structural walls, shares by rigid diaphragms</span>
      </div>
      {patch.error === null || placed ? null : (
        <p className="gw-problem mb-3 font-medium" role="alert">
          {problems[0]?.message ?? sentenceOf(patch.error)}
        </p>
      )}
      <div className="grid grid-cols-1 items-start gap-x-6 gap-y-5 xl:grid-cols-2">
        {groups.map((group) => (
          <fieldset key={group.title} className="min-w-0">
            <legend className="gw-section mb-1 w-full text-head leading-[24px] font-semibold">{group.title}</legend>
            <div>
              {group.fields.map((field) => (
                <Field
                  key={field.path}
                  field={field}
                  units={building.units}
                  draft={draftFor(field)}
                  disabled={!canEdit || (field.path === 'units' && hasRows)}
                  problem={wrong[field.path] ?? problemAt(problems, field.path)}
                  onDraft={(draft) => setDrafts((before) => ({ ...before, [field.path]: draft }))}
                />
              ))}
            </div>
          </fieldset>
        ))}
      </div>
    </form>
  );
}
