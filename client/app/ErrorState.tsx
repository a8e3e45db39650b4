import { Link } from 'react-router-dom';

import type { ApiProblem } from '#shared/contracts/errors';

import { Button } from '../components/ui/Button.tsx';
import type { ArtName } from '../components/ui/StateArt.tsx';
import { StateNote } from '../components/ui/StateNote.tsx';
import type { ApiError } from '../data/ApiError.ts';
import { errorSentences, tells } from './errorSentences.ts';
import { inputTabs, paths, type InputTab } from './paths.ts';

export interface ErrorStateProps {
  readonly error: ApiError;
  /** name of the page, for the line above the title */
  readonly place: string;
  readonly buildingId?: string;
  readonly onRetry?: () => void;
  readonly wholePage?: boolean;
}

const asTab = (table: string | undefined): InputTab => inputTabs.find((tab) => tab === table) ?? 'settings';

function placeOf(problem: ApiProblem): string {
  const parts = [
    problem.table ?? problem.file ?? '',
    problem.row === null ? '' : `row ${problem.row}`,
    problem.column ?? '',
  ];
  return parts.filter((part) => part !== '').join(', ');
}

/** Problems of what is stored, each with the way to its table. */
export function ProblemLinks({
  problems,
  buildingId,
}: {
  readonly problems: readonly ApiProblem[];
  readonly buildingId: string;
}) {
  return (
    <ol className="mt-2 flex flex-col">
      {problems.map((problem, index) => (
        <li
          key={index}
          className="grid grid-cols-[minmax(120px,176px)_1fr] gap-3 border-t border-rule py-2 first:border-t-0"
        >
          <Link
            className="gw-problem gw-linked font-semibold text-oxide"
            to={`${paths.inputs(buildingId, asTab(problem.table))}${problem.rowId === undefined ? '' : `?row=${problem.rowId}`}`}
          >
            {placeOf(problem) || 'building'}
          </Link>
          <span>{problem.message}</span>
        </li>
      ))}
    </ol>
  );
}

/** The designed page for a refused question: what is so, what was kept, the way on. */
export function ErrorState({ error, place, buildingId, onRetry, wholePage = false }: ErrorStateProps) {
  const { title, text } = errorSentences[error.code];
  const forbidden = error.code === 'forbidden';
  const computes = error.code === 'does-not-compute';
  const art: ArtName = forbidden ? 'closed' : computes ? 'unheld' : 'broken';
  const waits = error.code === 'offline' || error.code === 'busy' || error.code === 'internal';
  const heading = forbidden ? 'Work in progress is not shown' : title;
  return (
    <StateNote
      art={art}
      place={`${place}, ${forbidden ? 'for your role' : computes ? 'not computed' : 'refused'}`}
      title={heading}
      wholePage={wholePage}
      actions={
        <>
          {waits && onRetry !== undefined ? (
            <Button look="primary" onClick={onRetry}>
              Ask again
            </Button>
          ) : null}
          {computes && buildingId !== undefined ? (
            <Link
              className="gw-button gw-button-primary"
              to={paths.inputs(buildingId, asTab(error.problems[0]?.table))}
            >
              Edit inputs
            </Link>
          ) : null}
          {forbidden || error.code === 'not-found' ? (
            <Link className="gw-button" to={paths.buildings}>
              All buildings
            </Link>
          ) : null}
        </>
      }
    >
      <p>
        {forbidden
          ? 'Drafters see issued revisions. This building has none yet; it appears in your list once a revision is issued. For figures before that, ask the engineer of the building.'
          : text}
      </p>
      {tells(error) && error.problems.length === 0 ? <p>{error.message}</p> : null}
      {buildingId !== undefined && error.problems.length > 0 ? (
        <ProblemLinks problems={error.problems} buildingId={buildingId} />
      ) : null}
    </StateNote>
  );
}
