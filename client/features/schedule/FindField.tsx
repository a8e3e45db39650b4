import { useEffect, useRef, type ReactElement } from 'react';

export interface FindFieldProps {
  text: string;
  onText: (text: string) => void;
}

/** Whether a key typed there would be text: a field, or a cell of a grid that can be edited. */
const takesText = (target: EventTarget | null): boolean =>
  target instanceof Element &&
  target.closest('input, select, textarea, [role=gridcell]:not([aria-readonly=true])') !== null;

/** Narrows the schedule to a wall or a bar. `/` goes there from anywhere outside of a field; Escape shows all rows again. */
export function FindField({ text, onText }: FindFieldProps): ReactElement {
  const field = useRef<HTMLInputElement>(null);
  useEffect(() => {
    const onKey = (event: KeyboardEvent): void => {
      if (event.key !== '/' || event.ctrlKey || event.metaKey || event.altKey || takesText(event.target)) return;
      event.preventDefault();
      field.current?.focus();
      field.current?.select();
    };
    // before the grid reads the key as the beginning of a text
    window.addEventListener('keydown', onKey, { capture: true });
    return () => window.removeEventListener('keydown', onKey, { capture: true });
  }, []);
  return (
    <input
      ref={field}
      type="search"
      aria-label="Wall or bar"
      aria-keyshortcuts="/"
      placeholder="Wall or bar"
      className="gw-input gw-input-low w-[108px] min-[1400px]:w-[124px]"
      autoComplete="off"
      spellCheck={false}
      value={text}
      onChange={(event) => onText(event.target.value)}
      onKeyDown={(event) => {
        if (event.key === 'Escape') onText('');
      }}
    />
  );
}
