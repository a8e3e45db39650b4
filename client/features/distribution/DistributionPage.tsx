import type { ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { ResultDocument } from '#shared/contracts/result';
import type { TableResource } from '#shared/contracts/tables';
import { placeStackWalls } from '#shared/drawing/placeStackWalls';
import { forceDecimals, formatForce, formatShare } from '#shared/format/force';
import { formatPlanLength } from '#shared/format/length';

import { PageFrame } from '../../app/PageFrame.tsx';
import { useBuildingId } from '../../app/useBuildingId.ts';
import { useChoice } from '../../app/useChoice.ts';
import { Plan } from '../../components/drawing/Plan.tsx';
import {
  leadingWall,
  levelsDown,
  resultChoice,
  sayVariant,
  type ResultChoice,
} from '../../components/drawing/resultChoice.ts';
import { ResultGate } from '../../components/drawing/ResultGate.tsx';
import { Stack } from '../../components/drawing/Stack.tsx';
import { useWallKey } from '../../components/drawing/useWallKey.ts';
import { useWidth } from '../../components/drawing/useWidth.ts';
import { Segments } from '../../components/ui/Segments.tsx';
import { StateNote } from '../../components/ui/StateNote.tsx';
import { weighWarnings } from '../../components/warnings/heldRows.ts';
import { WarningList } from '../../components/warnings/WarningList.tsx';
import { useBuilding, useTable } from '../../data/queries.ts';
import { useComparison } from '../../engine/useComparison.ts';
import { BalanceTable } from './BalanceTable.tsx';
import { DriftNote } from './DriftNote.tsx';
import { RecomputeLine } from './RecomputeLine.tsx';
import { sayCenters } from './sayCenters.ts';
import { ShareTable } from './ShareTable.tsx';
import { storyBalances } from './storyBalances.ts';
import { storyShares, type WallShare } from './storyShares.ts';

/** px; a narrower page scrolls the plan sideways rather than shrink its text */
const planWidth = { least: 480, most: 690 };

/** What every wall takes of each story, and that nothing was lost. */
export function DistributionPage(): ReactElement {
  const id = useBuildingId();
  const [choice] = useChoice();
  return (
    <ResultGate buildingId={id} page="Distribution">
      {(document, walls) => {
        const chosen = resultChoice(document, choice);
        if (chosen === null) return <NoForces />;
        return <Shown id={id} document={document} walls={walls} chosen={chosen} />;
      }}
    </ResultGate>
  );
}

function NoForces(): ReactElement {
  return (
    <PageFrame title="Distribution">
      <StateNote art="empty" place="Distribution, no forces yet" title="No forces yet">
        <p>Levels and walls stand. Bring the forces by level and case, and each wall gets its share.</p>
      </StateNote>
    </PageFrame>
  );
}

interface ShownProps {
  id: string;
  document: ResultDocument;
  walls: TableResource<'walls'>;
  chosen: ResultChoice;
}

function Shown({ id, document, walls, chosen }: ShownProps): ReactElement {
  const [choice, choose] = useChoice();
  const { units } = document;
  const accidental = useBuilding(id).data?.accidental ?? 0;
  const forces = useTable(id, 'forces').data?.rows;
  const [planBox, drawnWidth] = useWidth(planWidth.least, planWidth.most);
  const comparison = useComparison(id, document);
  const seismic = forces?.find((row) => row.case === chosen.case)?.kind === 'seismic';
  const massName = seismic ? 'center of mass' : 'point of the force';
  const { level } = chosen;
  const shares = storyShares(document, walls.rows, { ...chosen, level: level.level });
  const wall = wallInView(shares.walls, choice.wall, leadingWall(document, chosen));
  const chooseWall = (name: string): void => choose({ wall: name });
  useWallKey(
    shares.walls.map((one) => one.wall),
    wall,
    chooseWall,
  );
  const force = unitLabels.force[units];
  const perThickness = units === 'us' ? 1 / 12 : 1 / 1000;
  const balances = storyBalances(document, chosen);
  const sayWall = (name: string): string => {
    const share = shares.walls.find((one) => one.wall === name);
    if (!share) return name;
    return `${name}, ${formatForce(share.total)} ${force}${share.share === null ? '' : `, ${formatShare(share.share)}`}`;
  };
  return (
    <PageFrame
      title="Distribution"
      sub={sayCenters(level, massName, units)}
      stackTitle={level.level}
      stackSub={sayStory(document, chosen)}
      stack={<ShearStack document={document} walls={walls} chosen={chosen} wall={wall} />}
      keys={[
        { keys: ['↑', '↓'], does: 'story' },
        { keys: ['W'], does: 'next wall' },
      ]}
    >
      <div className="grid gap-x-5 gap-y-4 min-[1400px]:grid-cols-[690px_minmax(0,1fr)] print:grid-cols-[690px_minmax(0,1fr)]">
        <div ref={planBox} className="min-w-0 max-[639px]:overflow-x-auto">
          <div className="flex flex-wrap gap-3">
            <Segments
              label="Case"
              options={chosen.cases.map((name) => ({ value: name, text: name }))}
              value={chosen.case}
              onChoose={(name) => choose({ case: name })}
            />
            {chosen.variants.length > 1 ? (
              <Segments
                label="Accidental eccentricity"
                options={chosen.variants.map((one) => ({ value: one, text: sayVariant(one, accidental) }))}
                value={chosen.variant}
                onChoose={(variant) => choose({ variant })}
              />
            ) : null}
          </div>
          <Plan
            input={{
              units,
              width: drawnWidth,
              extent: level.extent,
              walls: shares.walls.map((one) => ({
                ...one.geometry,
                name: one.wall,
                thickness: one.geometry.thickness * perThickness,
                direct: one.direct,
                torsional: one.torsional,
                total: one.total,
                share: one.share,
              })),
              mass: level.point,
              massName,
              rigidity: level.rigidity,
              force: {
                x: shares.vx,
                y: shares.vy,
                text: `${formatForce(shares.size)} ${force}`,
                note: `story shear, ${chosen.case}`,
              },
              chosenWall: wall,
            }}
            sayWall={sayWall}
            onChooseWall={chooseWall}
          />
        </div>
        <ShareTable
          shares={shares}
          units={units}
          level={level.level}
          caseName={chosen.case}
          chosenWall={wall}
          onChooseWall={chooseWall}
        />
      </div>
      <div className="mt-4 grid gap-5 min-[1400px]:grid-cols-[690px_minmax(0,1fr)] print:grid-cols-[690px_minmax(0,1fr)]">
        {balances.length > 0 ? (
          <BalanceTable balances={balances} title={`Balance, ${level.level}, ${chosen.case}`} units={units}>
            <RecomputeLine comparison={comparison} />
          </BalanceTable>
        ) : null}
        <DriftNote warnings={document.warnings} />
      </div>
      <div className="mt-4">
        <WarningList warnings={weighWarnings(document)} />
      </div>
    </PageFrame>
  );
}

/** The wall of the address, else the page's leading wall, else the one with the largest share here. */
function wallInView(walls: readonly WallShare[], wanted: string | null, leading: string | null): string | null {
  if (wanted !== null) return wanted;
  if (walls.some((one) => one.wall === leading)) return leading;
  return [...walls].sort((a, b) => Math.abs(b.total) - Math.abs(a.total))[0]?.wall ?? null;
}

function sayStory(document: ResultDocument, { level }: ResultChoice): string {
  const unit = document.units === 'us' ? 'ft' : 'm';
  const print = (length: number): string => `${formatPlanLength(length, document.units)} ${unit}`;
  return `elevation ${print(level.elevation)}, story ${print(level.height)}`;
}

function ShearStack({ document, walls, chosen, wall }: Omit<ShownProps, 'id'> & { wall: string | null }): ReactElement {
  const [, choose] = useChoice();
  const levels = levelsDown(document);
  const shears = levels.map((level) => {
    const { vx = 0, vy = 0 } = level.shear[chosen.case] ?? {};
    return Math.sqrt(vx * vx + vy * vy);
  });
  const decimals = forceDecimals(shears);
  return (
    <Stack
      stories={levels.map((level, index) => ({
        level: level.level,
        elevation: level.elevation,
        height: level.height,
        value: shears[index] ?? 0,
        text: formatForce(shears[index] ?? 0, decimals),
      }))}
      walls={placeStackWalls(levels, walls.rows)}
      caption={`Story shear ${chosen.case}`}
      unit={unitLabels.force[document.units]}
      units={document.units}
      chosen={chosen.level.level}
      onChoose={(level) => choose({ level })}
      chosenWall={wall}
    />
  );
}
