import { useEffect, useRef } from 'react';

import { keyInEditor, steppedChoice } from './gridKeys.ts';

export interface CellEditorProps {
  readonly label: string;
  readonly draft: string;
  readonly valid: boolean;
  readonly align: 'left' | 'right';
  readonly choices?: readonly string[];
  /** id of the reading line */
  readonly describedBy: string;
  readonly onDraft: (draft: string) => void;
  readonly onCommit: (rows: number, columns: number) => void;
  readonly onLeave: () => void;
  readonly onBlur: () => void;
}

/** The text field inside a cell. Enter and Tab commit, Escape leaves; the rest is typing. */
export function CellEditor({
  label,
  draft,
  valid,
  align,
  choices,
  describedBy,
  onDraft,
  onCommit,
  onLeave,
  onBlur,
}: CellEditorProps) {
  const field = useRef<HTMLInputElement>(null);
  useEffect(() => {
    const input = field.current;
    if (input === null) return;
    input.focus({ preventScroll: true });
    const end = input.value.length;
    input.setSelectionRange(end, end);
  }, []);
  return (
    <input
      ref={field}
      className={`gw-editor mono ${align === 'right' ? 'num' : ''} ${valid ? '' : 'gw-editor-refused'}`}
      aria-label={label}
      aria-invalid={!valid}
      aria-describedby={describedBy}
      autoComplete="off"
      spellCheck={false}
      value={draft}
      onChange={(event) => onDraft(event.target.value)}
      onBlur={onBlur}
      onKeyDown={(event) => {
        event.stopPropagation();
        const press = {
          key: event.key,
          ctrl: event.ctrlKey || event.metaKey,
          shift: event.shiftKey,
          alt: event.altKey,
        };
        const intent = keyInEditor(press, choices !== undefined);
        if (intent === null || event.nativeEvent.isComposing) return;
        event.preventDefault();
        if (intent.kind === 'commit') onCommit(intent.rows, intent.columns);
        else if (intent.kind === 'leave') onLeave();
        else if (intent.kind === 'step-choice') onDraft(steppedChoice(choices ?? [], draft, intent.by));
      }}
      onCopy={(event) => event.stopPropagation()}
      onPaste={(event) => event.stopPropagation()}
    />
  );
}
