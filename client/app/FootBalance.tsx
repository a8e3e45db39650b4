import { useMemo } from 'react';

import { useResults, useTable } from '../data/queries.ts';
import { balanceInView } from './balanceInView.ts';
import { useChoice } from './useChoice.ts';

const force = (value: number): string =>
  Math.abs(value).toLocaleString('en-US', { minimumFractionDigits: 1, maximumFractionDigits: 1 });

const residualText = (value: number): string =>
  value === 0 ? '0.0' : Math.abs(value).toExponential(1).replace('-', '−');

/** Applied against resisted, on every page; it breaks loudly when something was lost on the way. */
export function FootBalance({ buildingId }: { readonly buildingId: string }) {
  const results = useResults(buildingId);
  const [choice] = useChoice();
  const walls = useTable(buildingId, 'walls').data?.rows;
  const document = results.isError ? undefined : results.data;
  const balance = useMemo(
    () => (document === undefined ? null : balanceInView(document, { case: choice.case }, walls)),
    [document, choice.case, walls],
  );
  if (balance === null) {
    return (
      <div className="gw-balance">
        <b>Balance</b>
        <span className="text-graphite">{results.isPending ? 'computing' : 'nothing computed yet'}</span>
      </div>
    );
  }
  const unit = results.data?.units === 'si' ? 'kN' : 'kip';
  const residual = residualText(balance.worst.residual);
  if (balance.lost !== null) {
    const { basis, level, direction, sum, resisted, residual: open } = balance.lost;
    return (
      <div className="gw-balance gw-balance-broken" role="alert">
        <b>Balance broken</b>
        <span>
          {balance.case}, {level}, {basis}: the shares in {direction} add up to {force(sum)}, resisted are{' '}
          {force(resisted)} {unit}; residual {residualText(open)}, over 1e−9. A load is lost on the way.
        </span>
      </div>
    );
  }
  if (!balance.closed) {
    return (
      <div className="gw-balance gw-balance-broken" role="alert">
        <b>Balance broken</b>
        <span>
          {balance.case}, {balance.worst.level}: residual {residual}, over 1e−9. A load is lost on the way.
        </span>
      </div>
    );
  }
  return (
    <div className="gw-balance">
      <b>Balance</b>
      {balance.base === null ? (
        <span>{balance.case}</span>
      ) : (
        <>
          <span>
            {balance.case} applied <b>{force(balance.base.applied)}</b>
          </span>
          <span>
            resisted <b>{force(balance.base.resisted)}</b> {unit}
          </span>
        </>
      )}
      <span className="text-graphite">residual {residual}</span>
    </div>
  );
}
