import { useId } from 'react';

import { Segments } from '../../components/ui/Segments.tsx';
import { fieldUnit, type SettingField as Described } from './settingFields.ts';

const switchChoices = [
  { value: 'yes', text: 'Yes' },
  { value: 'no', text: 'No' },
];

/** A list shows all of its eight usual spacings; a number stands at the right. */
const fieldClass = (kind: Described['kind']): string => {
  if (kind === 'list') return 'mono w-[min(288px,56vw)]!';
  return kind === 'text' ? 'w-[220px]!' : 'w-[112px]! text-right';
};

/** One setting: its label with unit and note, and a field of its kind; a problem stands beneath. */
export function SettingField({
  field,
  units,
  draft,
  disabled,
  problem,
  onDraft,
}: {
  readonly field: Described;
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
  return (
    <div className="grid grid-cols-[minmax(0,1fr)_auto] items-center gap-x-3 border-t border-rule py-1 first:border-t-0">
      {choices === undefined ? (
        <label htmlFor={id} className="gw-label">
          {label}
        </label>
      ) : (
        <span className="gw-label">{label}</span>
      )}
      {field.kind === 'set' ? (
        <SetOf field={field} draft={draft} disabled={disabled} onDraft={onDraft} />
      ) : choices === undefined ? (
        <input
          id={id}
          className={`gw-input gw-input-low ${fieldClass(field.kind)}`}
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

/** Several of a few, in the order of the choices; the last one can't be taken out. */
function SetOf({
  field,
  draft,
  disabled,
  onDraft,
}: {
  readonly field: Described;
  readonly draft: string;
  readonly disabled: boolean;
  readonly onDraft: (draft: string) => void;
}) {
  const chosen = draft.split(/\s+/).filter((word) => word !== '');
  const toggled = (value: string) =>
    (field.choices ?? [])
      .map((choice) => choice.value)
      .filter((one) => (one === value ? !chosen.includes(one) : chosen.includes(one)));
  return (
    <div className="gw-segments" role="group" aria-label={field.label}>
      {(field.choices ?? []).map(({ value, text }) => (
        <button
          key={value}
          type="button"
          aria-pressed={chosen.includes(value)}
          disabled={disabled || (chosen.length === 1 && chosen[0] === value)}
          onClick={() => onDraft(toggled(value).join(' '))}
        >
          {text}
        </button>
      ))}
    </div>
  );
}
