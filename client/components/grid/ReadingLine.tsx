import type { ReactNode } from 'react';

export interface ReadingLineProps {
  readonly id: string;
  readonly columnCount: number;
  readonly column: number;
  readonly expected: string | null;
  /** Enter was pressed although the draft does not parse */
  readonly refused: boolean;
  readonly choices?: readonly string[];
  readonly draft: string;
  readonly children: ReactNode;
}

const choicesShown = 8;

/** The choices that the draft may still become, the fitting one in ink. */
function ChoiceWords({ choices, draft }: { readonly choices: readonly string[]; readonly draft: string }) {
  const at = Math.max(0, choices.indexOf(draft));
  const from = Math.max(0, Math.min(at - 3, choices.length - choicesShown));
  const shown = choices.slice(from, from + choicesShown);
  return (
    <span>
      <b>one of {choices.length}</b>
      {from > 0 ? '… ' : ''}
      {shown.map((choice, index) => (
        <span key={choice} className={choice === draft ? 'font-semibold' : 'text-graphite'}>
          {index === 0 ? '' : ', '}
          {choice}
        </span>
      ))}
      {from + choicesShown < choices.length ? ' …' : ''}
    </span>
  );
}

/** What the typed text is taken for, in a line of its own under the row; never over other rows. */
export function ReadingLine({
  id,
  columnCount,
  column,
  expected,
  refused,
  choices,
  draft,
  children,
}: ReadingLineProps) {
  const late = column >= columnCount / 2;
  const own = expected === null && children !== null && children !== undefined;
  if (!own && expected === null && choices === undefined) return null;
  return (
    <div role="row" className="gw-grid-row gw-grid-reading">
      <div
        role="gridcell"
        aria-colspan={columnCount}
        className={late ? 'justify-end' : ''}
        style={{ gridColumn: late ? `1 / ${column + 2}` : `${column + 1} / -1` }}
      >
        <div
          id={id}
          role={refused ? 'alert' : 'status'}
          className={`gw-reading ${expected === null ? '' : 'gw-reading-refused'}`}
        >
          {expected === null ? (
            own ? (
              children
            ) : (
              <ChoiceWords choices={choices ?? []} draft={draft} />
            )
          ) : (
            <span>
              <b>expected</b>
              {expected}
            </span>
          )}
          <span className="gw-keys" aria-hidden="true">
            {expected === null ? (
              <span>
                <kbd>Enter</kbd>keep
              </span>
            ) : null}
            <span>
              <kbd>Esc</kbd>leave
            </span>
          </span>
        </div>
      </div>
    </div>
  );
}
