import { useParams } from 'react-router-dom';

import { FootBalance } from './FootBalance.tsx';

export interface KeyHint {
  readonly keys: readonly string[];
  readonly does: string;
}

export const caution =
  'An aid for qualified engineers. The governing local code prevails; a licensed professional must review results before they are used for construction.';

export interface FootProps {
  readonly keys: readonly KeyHint[];
  /** `ask`: the page has figures; `wait`: tables are still missing, so the server is not asked; `none`: no building in view */
  readonly balance?: 'ask' | 'wait' | 'none';
}

/** Always there: the balance of the case in view, the caution, up to four key hints. */
export function Foot({ keys, balance = 'none' }: FootProps) {
  const { buildingId } = useParams();
  return (
    <footer className="gw-foot">
      {balance === 'ask' && buildingId !== undefined ? <FootBalance buildingId={buildingId} /> : null}
      {balance === 'wait' ? (
        <div className="gw-balance">
          <b>Balance</b>
          <span className="text-graphite">follows levels, walls and forces</span>
        </div>
      ) : null}
      <div className="gw-caution">{caution}</div>
      {keys.length === 0 ? null : (
        <div className="gw-keys">
          {keys.slice(0, 4).map((hint) => (
            <span key={hint.does}>
              {hint.keys.map((key) => (
                <kbd key={key}>{key}</kbd>
              ))}
              {hint.does}
            </span>
          ))}
        </div>
      )}
    </footer>
  );
}
