import { useMemo, type ReactElement } from 'react';

import { rigidityModels } from '#shared/engineering/rigidity/compareModels';
import { formatNumber } from '#shared/format/number';

import { WallButton } from '../../components/drawing/WallButton.tsx';
import { Section } from '../../components/ui/Section.tsx';
import { useBuildingInput } from '../../engine/useBuildingInput.ts';
import { farthestModel, rigidityComparison, sayComparison } from './rigidityComparison.ts';

export interface RigidityPanelProps {
  buildingId: string;
  level: string;
  chosenWall: string | null;
  onChooseWall: (wall: string) => void;
}

/** How the shares by rigidity move with the model of a wall's stiffness, computed in the page. */
export function RigidityPanel({
  buildingId,
  level,
  chosenWall,
  onChooseWall,
}: RigidityPanelProps): ReactElement | null {
  const input = useBuildingInput(buildingId);
  const walls = useMemo(() => (input === null ? null : rigidityComparison(input, level)), [input, level]);
  if (walls === null || walls.length === 0) return null;
  return (
    <Section
      title="How much the model matters"
      aside={`${level}: part of the walls that run the same way, by rigidity, %`}
    >
      <div className="overflow-x-auto">
        <table className="gw-table">
          <thead>
            <tr>
              <th>Wall</th>
              {rigidityModels.map((model) => (
                <th key={model} className="num">
                  {model}
                </th>
              ))}
              <th className="pl-3!">Farthest from as set</th>
            </tr>
          </thead>
          <tbody>
            {walls.map((wall) => {
              const farthest = farthestModel(wall);
              return (
                <tr
                  key={wall.wall}
                  className={`cursor-pointer ${wall.wall === chosenWall ? 'on' : ''}`}
                  onClick={() => onChooseWall(wall.wall)}
                >
                  <th scope="row">
                    <WallButton wall={wall.wall} chosen={wall.wall === chosenWall} onChoose={onChooseWall} />
                  </th>
                  {rigidityModels.map((model) => (
                    <td key={model} className={`num ${model === farthest?.model ? 'font-semibold underline' : ''}`}>
                      {formatNumber(wall.share[model] * 100, 1)}
                    </td>
                  ))}
                  <td className="pl-3! text-graphite">
                    {farthest === null
                      ? 'none'
                      : `${farthest.model}, ${farthest.share > farthest.asSet ? '+' : ''}${formatNumber((farthest.share - farthest.asSet) * 100, 1)}`}
                  </td>
                </tr>
              );
            })}
          </tbody>
        </table>
      </div>
      <p className="mt-2 max-w-[92ch] pl-2 text-data">{sayComparison(walls)}</p>
    </Section>
  );
}
