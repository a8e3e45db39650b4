import type { ApiProblem } from '#shared/contracts/errors';

/** Quoted readings in the server's sentence stand out as typed text. */
function Sentence({ text }: { readonly text: string }) {
  const parts = text.split(/("[^"]*")/g);
  return (
    <>
      {parts.map((part, index) =>
        part.length > 2 && part.startsWith('"') && part.endsWith('"') ? (
          <code key={index} className="gw-code">
            {part.slice(1, -1)}
          </code>
        ) : (
          <span key={index}>{part}</span>
        ),
      )}
    </>
  );
}

function placeOf(problem: ApiProblem): string {
  const parts = [problem.row === null ? '' : `Row ${problem.row}`, problem.column ?? ''].filter((part) => part !== '');
  return parts.length === 0 ? 'File' : parts.join(', ');
}

/** Every problem of a refused file: place, what was read, what was expected, what to do. */
export function ProblemList({ problems }: { readonly problems: readonly ApiProblem[] }) {
  return (
    <ol className="max-h-[340px] overflow-auto" tabIndex={0} aria-label="Problems">
      {problems.map((problem, index) => (
        <li key={index} className="grid grid-cols-[112px_1fr] gap-3 border-t border-rule py-2 first:border-t-0">
          <b className="gw-problem font-semibold break-words text-oxide">{placeOf(problem)}</b>
          <span className="min-w-0 break-words">
            <Sentence text={problem.message} />
          </span>
        </li>
      ))}
    </ol>
  );
}
