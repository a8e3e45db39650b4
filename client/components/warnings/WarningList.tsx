import { useEffect, useRef, useState, type ReactElement } from 'react';
import { useLocation } from 'react-router-dom';

import { useCanEdit } from '../../app/useCanEdit.ts';
import { useAcknowledgments } from '../../data/queries.ts';
import { Button } from '../ui/Button.tsx';
import { Section } from '../ui/Section.tsx';
import { acknowledgmentOf } from './acknowledgmentOf.ts';
import type { WeighedWarning } from './heldRows.ts';
import { Judgement } from './Judgement.tsx';

export interface WarningListProps {
  buildingId: string;
  warnings: readonly WeighedWarning[];
}

/** the place in the page that other pages lead to */
export const warningsAnchor = 'what-to-weigh';

const shownAtFirst = 10;

const sayRows = (count: number): string => (count === 1 ? '1 row not settled' : `${count} rows not settled`);

/** What an engineer has to judge: where, what, and which rows wait for it. Nothing where there is nothing to judge. */
export function WarningList({ buildingId, warnings }: WarningListProps): ReactElement | null {
  const { hash } = useLocation();
  const judged = useAcknowledgments(buildingId).data?.rows ?? [];
  const canEdit = useCanEdit();
  const place = useRef<HTMLDivElement>(null);
  const [all, setAll] = useState(false);
  useEffect(() => {
    if (hash === `#${warningsAnchor}`) place.current?.scrollIntoView({ block: 'start' });
  }, [hash]);
  if (warnings.length === 0) return null;
  const shown = all ? warnings : warnings.slice(0, shownAtFirst);
  const holding = warnings.some((one) => one.holds > 0);
  return (
    <div id={warningsAnchor} ref={place} className="scroll-mt-4">
      <Section
        title="What to weigh"
        {...(holding ? { aside: 'first what leaves rows of the schedule not settled' } : {})}
      >
        <table className="gw-table gw-table-prose">
          <thead>
            <tr>
              <th className="w-[84px]">Level</th>
              <th className="w-[84px]">Wall</th>
              <th>What</th>
              <th className="w-[148px]">Schedule</th>
            </tr>
          </thead>
          <tbody>
            {shown.map(({ warning, holds }, index) => (
              <tr key={`${warning.code} ${warning.level ?? ''} ${warning.wall ?? ''} ${index}`}>
                <td className="font-medium">{warning.level ?? <NoPlace />}</td>
                <td className="font-medium">{warning.wall ?? <NoPlace />}</td>
                <td>
                  {warning.message}
                  <Judgement
                    buildingId={buildingId}
                    warning={warning}
                    last={acknowledgmentOf(warning, judged)}
                    canAccept={canEdit}
                  />
                </td>
                <td className={holds > 0 ? 'font-semibold' : 'text-graphite'}>
                  {holds > 0 ? sayRows(holds) : warning.settled ? 'settled' : '–'}
                </td>
              </tr>
            ))}
          </tbody>
        </table>
        {shown.length < warnings.length ? (
          <Button look="text" className="mt-1" onClick={() => setAll(true)}>
            Show all {warnings.length}
          </Button>
        ) : null}
      </Section>
    </div>
  );
}

/** of the building as a whole */
const NoPlace = (): ReactElement => <span className="font-normal text-graphite">–</span>;
