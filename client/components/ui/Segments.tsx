export interface SegmentsProps<Value extends string> {
  /** what is chosen here, for assistive technology */
  readonly label: string;
  readonly options: readonly { readonly value: Value; readonly text: string }[];
  readonly value: Value;
  readonly onChoose: (value: Value) => void;
  readonly disabled?: boolean;
}

/** One of a few: the pressed one is inverted. */
export function Segments<Value extends string>({
  label,
  options,
  value,
  onChoose,
  disabled = false,
}: SegmentsProps<Value>) {
  return (
    <div className="gw-segments" role="group" aria-label={label}>
      {options.map((option) => (
        <button
          key={option.value}
          type="button"
          aria-pressed={option.value === value}
          disabled={disabled}
          onClick={() => onChoose(option.value)}
        >
          {option.text}
        </button>
      ))}
    </div>
  );
}
