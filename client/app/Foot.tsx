import { useParams } from 'react-router-dom';

import { FootBalance } from './FootBalance.tsx';

export interface KeyHint {
  readonly keys: readonly string[];
  readonly does: string;
}

export const caution =
  'An aid for qualified engineers. The governing local code prevails; a licensed professional must review results before they are used for construction.';

/** Always there: the balance of the case in view, the caution, up to four key hints. */
export function Foot({ keys }: { readonly keys: readonly KeyHint[] }) {
  const { buildingId } = useParams();
  return (
    <footer className="gw-foot">
      {buildingId === undefined ? null : <FootBalance buildingId={buildingId} />}
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
