import { useState, type ReactElement } from 'react';

import type { ResultDocument } from '#shared/contracts/result';
import type { ScheduleResource } from '#shared/contracts/schedule';
import type { TableResource } from '#shared/contracts/tables';

import { ErrorState } from '../../app/ErrorState.tsx';
import { PageFrame } from '../../app/PageFrame.tsx';
import { useBuildingId } from '../../app/useBuildingId.ts';
import { ResultGate } from '../../components/drawing/ResultGate.tsx';
import { Segments } from '../../components/ui/Segments.tsx';
import { useSchedule } from '../../data/queries.ts';
import { DownloadButton } from './DownloadButton.tsx';
import { FindField } from './FindField.tsx';
import { ScheduleSheet } from './ScheduleSheet.tsx';
import { scheduleFilters, summarize, type ScheduleFilter } from './scheduleFilter.ts';
import { ScheduleStack } from './ScheduleStack.tsx';
import { useScheduleChoice } from './useScheduleChoice.ts';

/** The wall schedule: what goes on the drawing, with every check behind it. */
export function SchedulePage(): ReactElement {
  const id = useBuildingId();
  const schedule = useSchedule(id);
  return (
    <ResultGate buildingId={id} page="Wall schedule">
      {(document, walls) =>
        schedule.isError ? (
          <PageFrame title="Wall schedule">
            <ErrorState
              error={schedule.error}
              place="Wall schedule"
              buildingId={id}
              onRetry={() => void schedule.refetch()}
            />
          </PageFrame>
        ) : schedule.data ? (
          <Shown id={id} document={document} walls={walls} schedule={schedule.data} />
        ) : (
          <PageFrame title="Wall schedule">
            <p className="sr-only" role="status">
              Fetching the schedule
            </p>
          </PageFrame>
        )
      }
    </ResultGate>
  );
}

interface ShownProps {
  id: string;
  document: ResultDocument;
  walls: TableResource<'walls'>;
  schedule: ScheduleResource;
}

function Shown({ id, document, walls, schedule }: ShownProps): ReactElement {
  const [filter, setFilter] = useState<ScheduleFilter>('all');
  const [find, setFind] = useState('');
  const choice = useScheduleChoice(document, schedule.rows);
  const { size, over, rest } = summarize(schedule.rows);
  return (
    <PageFrame
      title="Wall schedule"
      sub={
        <>
          {size}.{' '}
          {over === null ? null : (
            <>
              <b>{over}</b>
              {rest.length === 0 ? '.' : ', '}
            </>
          )}
          {rest.length === 0 ? null : `${rest.join(', ')}.`}
        </>
      }
      actions={
        <>
          <Segments label="Rows" options={scheduleFilters} value={filter} onChoose={setFilter} />
          <FindField text={find} onText={setFind} />
          <DownloadButton id={id} />
        </>
      }
      stackTitle={choice.title}
      stackSub={choice.sub}
      stack={<ScheduleStack document={document} walls={walls} choice={choice} />}
      keys={[
        { keys: ['Enter'], does: 'edit' },
        { keys: ['Ctrl', 'Z'], does: 'undo' },
        { keys: ['Del'], does: 'auto selection' },
        { keys: ['/'], does: 'find' },
      ]}
    >
      <ScheduleSheet
        id={id}
        document={document}
        walls={walls}
        schedule={schedule}
        filter={filter}
        find={find}
        choice={choice}
      />
    </PageFrame>
  );
}
