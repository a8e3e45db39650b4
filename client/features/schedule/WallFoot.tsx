import type { ReactElement } from 'react';

import type { ResultDocument, ResultQuantities } from '#shared/contracts/result';
import type { ScheduleResourceRow } from '#shared/contracts/schedule';
import type { UnitSystem } from '#shared/engineering/input';
import { unitFactors } from '#shared/engineering/units';
import { formatNumber } from '#shared/format/number';

import { wallNotes, wallReasons } from './wallNotes.ts';

export interface WallFootProps {
  rows: readonly ScheduleResourceRow[];
  quantities: ResultQuantities['walls'][number] | undefined;
  units: UnitSystem;
  document: Pick<ResultDocument, 'warnings' | 'levels'>;
}

/** kg/m3, ordinary walls: common practice */
const usualRates = [60, 150];
const { us, si } = unitFactors;
const poundsPerCubicYard = (si.mass * us.volume) / si.volume;

/** Notes that save a call, and what the wall takes of concrete and steel. */
export function WallFoot({ rows, quantities, units, document }: WallFootProps): ReactElement {
  const reasons = wallReasons(rows, document);
  const [volume, mass] = units === 'us' ? ['yd³', 'lb'] : ['m³', 'kg'];
  const perVolume = units === 'us' ? poundsPerCubicYard : 1;
  const usual = usualRates.map((rate) => formatNumber(rate * perVolume, 0)).join(' to ');
  return (
    <div className="w-full min-w-0">
      <div className="flex min-h-[32px] items-start gap-4 py-[6px] text-data">
        <span className="flex-none text-graphite">Notes</span>
        <ul className="flex flex-wrap overflow-hidden">
          {wallNotes(rows).map((note) => (
            <li key={note.text} className="-ml-[17px] border-l border-line pr-[33px] pl-4">
              <span
                className={
                  note.own
                    ? 'border-l-[3px] border-ochre pl-2 underline decoration-ochre decoration-2 underline-offset-[3px]'
                    : ''
                }
              >
                {note.text}
              </span>
              {note.own ? <span className="sr-only">, overwritten</span> : null}
              {note.where === null ? null : <span className="text-graphite">, {note.where}</span>}
            </li>
          ))}
        </ul>
      </div>
      {reasons.length === 0 ? null : (
        <div className="flex min-h-[28px] items-start gap-4 pb-[6px] text-data">
          <b className="flex-none font-semibold">Not settled</b>
          <ul>
            {reasons.map((reason) => (
              <li key={reason.text}>
                {reason.text}
                {reason.where === null ? null : <span className="text-graphite">, {reason.where}</span>}
              </li>
            ))}
          </ul>
        </div>
      )}
      {quantities ? (
        <div className="flex h-[32px] items-center gap-5 bg-well px-2 text-data">
          <Figure name="Concrete" value={`${formatNumber(quantities.concrete, 1)} ${volume}`} />
          <Figure name="Steel with laps" value={`${formatNumber(quantities.steel, 0)} ${mass}`} />
          <Figure name="Rate" value={`${formatNumber(quantities.rate, 0)} ${mass}/${volume}`} />
          <span className="text-graphite">usual {usual}</span>
        </div>
      ) : null}
    </div>
  );
}

function Figure({ name, value }: { name: string; value: string }): ReactElement {
  return (
    <span className="font-medium">
      <span className="mr-2 font-normal text-graphite">{name}</span>
      {value}
    </span>
  );
}
