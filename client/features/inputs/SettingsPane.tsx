import { useState, type SubmitEvent } from 'react';

import type { BuildingResource } from '#shared/contracts/buildings';
import type { ApiProblem } from '#shared/contracts/errors';

import { sentenceOf } from '../../app/errorSentences.ts';
import { Button } from '../../components/ui/Button.tsx';
import { usePatchBuilding, type BuildingPatch } from '../../data/mutations.ts';
import { draftOf, putAt, readDraft, recordPath, valueAt } from './settingDraft.ts';
import { SettingField as Field } from './SettingField.tsx';
import { settingGroups, type SettingField } from './settingFields.ts';

export interface SettingsPaneProps {
  readonly building: BuildingResource;
  readonly canEdit: boolean;
  /** or not known yet: units can't change then */
  readonly hasRows: boolean;
  /** cases of the forces table, for the base shears expected */
  readonly cases: readonly string[];
  /** for the springs at their bases */
  readonly walls: readonly string[];
}

const problemAt = (problems: readonly ApiProblem[], path: string): string | null =>
  problems.find((problem) => problem.column === path || problem.column?.startsWith(`${path}.`) === true)?.message ??
  null;

/** building.json as a form: what is built, in groups, with units; a blank field takes its default. */
export function SettingsPane({ building, canEdit, hasRows, cases, walls }: SettingsPaneProps) {
  const patch = usePatchBuilding(building.id);
  const [drafts, setDrafts] = useState<Readonly<Record<string, string>>>({});
  const [wrong, setWrong] = useState<Readonly<Record<string, string>>>({});
  const shearFields: readonly SettingField[] = cases.map((name) => ({
    path: `expectedBaseShear.${name}`,
    label: name,
    kind: 'number',
    quantity: 'force',
  }));
  const springFields: readonly SettingField[] = walls.map((name) => ({
    path: `baseSprings.${name}`,
    label: name,
    kind: 'number',
    quantity: 'moment',
    note: 'per radian',
  }));
  const groups = [
    ...settingGroups,
    ...(shearFields.length === 0 ? [] : [{ title: 'Base shear of your load sheet', fields: shearFields }]),
    ...(springFields.length === 0 ? [] : [{ title: 'Rotation springs at bases, blank: fixed', fields: springFields }]),
  ];
  const stored = (field: SettingField) => {
    const inRecord = recordPath(field.path);
    return draftOf(inRecord === null ? valueAt(building, field.path) : building[inRecord.key][inRecord.name]);
  };
  const draftFor = (field: SettingField) => drafts[field.path] ?? stored(field);
  const changed = groups.flatMap((group) => group.fields.filter((field) => draftFor(field) !== stored(field)));
  const problems = patch.error?.problems ?? [];
  const placed = groups.some((group) => group.fields.some((field) => problemAt(problems, field.path) !== null));

  const submit = (event: SubmitEvent<HTMLFormElement>) => {
    event.preventDefault();
    const body: Record<string, unknown> = { version: building.version };
    const faults: Record<string, string> = {};
    const records: Record<string, Record<string, unknown>> = {};
    for (const field of changed) {
      const read = readDraft(field, draftFor(field));
      const inRecord = recordPath(field.path);
      if (!read.ok) faults[field.path] = `read ${draftFor(field)}, expected ${read.expected}`;
      else if (inRecord === null) putAt(body, field.path, read.value);
      else {
        const record = (records[inRecord.key] ??= { ...building[inRecord.key] });
        if (read.value === null) Reflect.deleteProperty(record, inRecord.name);
        else record[inRecord.name] = read.value;
      }
    }
    setWrong(faults);
    if (Object.keys(faults).length > 0) return;
    patch.mutate({ ...body, ...records } as BuildingPatch, { onSuccess: () => setDrafts({}) });
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
        <span className="note ml-auto">Code ACI 318-19, ordinary structural walls</span>
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
