import { useMemo, useState, type ReactElement } from 'react';

import type { ResultDocument } from '#shared/contracts/result';
import type { TableResource } from '#shared/contracts/tables';
import { formatPlanLength } from '#shared/format/length';

import { balanceInView } from '../../app/balanceInView.ts';
import { PageFrame } from '../../app/PageFrame.tsx';
import { useBuildingId } from '../../app/useBuildingId.ts';
import { useCanEdit } from '../../app/useCanEdit.ts';
import { useChoice } from '../../app/useChoice.ts';
import {
  leadingWall,
  levelsDown,
  resultChoice,
  sayVariant,
  type ResultChoice,
} from '../../components/drawing/resultChoice.ts';
import { ResultGate } from '../../components/drawing/ResultGate.tsx';
import { useWallKey } from '../../components/drawing/useWallKey.ts';
import { useWidth } from '../../components/drawing/useWidth.ts';
import { Segments } from '../../components/ui/Segments.tsx';
import { StateNote } from '../../components/ui/StateNote.tsx';
import { weighWarnings } from '../../components/warnings/heldRows.ts';
import { WarningList } from '../../components/warnings/WarningList.tsx';
import { useBuilding, useTable } from '../../data/queries.ts';
import { useComparison } from '../../engine/useComparison.ts';
import { BalanceTable } from './BalanceTable.tsx';
import { BasesTable } from './BasesTable.tsx';
import { DistributionStack } from './DistributionStack.tsx';
import { DriftTable } from './DriftTable.tsx';
import { EnvelopeButton } from './EnvelopeButton.tsx';
import { levelDrifts, totalWindDrift } from './levelDrifts.ts';
import { RecomputeLine } from './RecomputeLine.tsx';
import { RigidityPanel } from './RigidityPanel.tsx';
import { sayCenters } from './sayCenters.ts';
import { ShareTable } from './ShareTable.tsx';
import { quantityTexts, stackQuantities, type StackQuantity } from './stackQuantity.ts';
import { basisResiduals, storyBalances } from './storyBalances.ts';
import { storyBases } from './storyBases.ts';
import { StoryPlan } from './StoryPlan.tsx';
import { storyShares, type WallShare } from './storyShares.ts';
import { WallBasesSection } from './WallBasesSection.tsx';
import { wallUnderBases } from './wallUnderBases.ts';

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
  const [quantity, setQuantity] = useState<StackQuantity>('shear');
  const { units } = document;
  const building = useBuilding(id).data;
  const canEdit = useCanEdit();
  const accidental = building?.accidental ?? 0;
  const forces = useTable(id, 'forces').data?.rows;
  const [planBox, drawnWidth] = useWidth(planWidth.least, planWidth.most);
  const comparison = useComparison(id, document);
  const seismic = forces?.find((row) => row.case === chosen.case)?.kind === 'seismic';
  const massName = seismic ? 'center of mass' : 'point of the force';
  const { level } = chosen;
  const down = levelsDown(document);
  const shares = storyShares(document, walls.rows, { ...chosen, level: level.level });
  const inView = { ...chosen, variant: choice.variant, level: level.level };
  const bases = storyBases(document, walls.rows, inView);
  const drifts = levelDrifts(document, down, inView);
  const leading = leadingWall(document, { ...chosen, basis: chosen.bases[0] ?? chosen.basis });
  const wall = wallInView(shares.walls, choice.wall, leading);
  const chooseWall = (name: string): void => choose({ wall: name });
  const chooseLevel = (name: string): void => choose({ level: name });
  useWallKey(
    shares.walls.map((one) => one.wall),
    wall,
    chooseWall,
  );
  const balances = storyBalances(document, chosen);
  const lost = useMemo(
    () => balanceInView(document, { case: chosen.case }, walls.rows)?.lost ?? null,
    [document, chosen.case, walls.rows],
  );
  const variantText = sayVariant(chosen.variant, accidental);
  return (
    <PageFrame
      title="Distribution"
      sub={sayCenters(level, massName, units)}
      actions={
        <>
          <Segments
            label="Bars of the stack"
            options={stackQuantities.map((one) => ({ value: one, text: quantityTexts[one] }))}
            value={quantity}
            onChoose={setQuantity}
          />
          {canEdit && building ? <EnvelopeButton building={building} /> : null}
        </>
      }
      stackTitle={level.level}
      stackSub={sayStory(document, chosen)}
      stack={
        <DistributionStack
          document={document}
          walls={walls}
          chosen={chosen}
          wall={wall}
          drifts={drifts}
          quantity={quantity}
        />
      }
      keys={[
        { keys: ['↑', '↓'], does: 'story' },
        { keys: ['W'], does: 'next wall' },
      ]}
    >
      <div className="grid gap-x-5 gap-y-4 min-[1400px]:grid-cols-[690px_minmax(0,1fr)] print:grid-cols-[690px_minmax(0,1fr)]">
        <div ref={planBox} className="min-w-0 max-[639px]:overflow-x-auto">
          <div className="flex flex-wrap gap-3 max-[1399px]:pt-2">
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
            {chosen.bases.length > 1 ? (
              <Segments
                label="Basis"
                options={bases.bases.map((one) => ({ value: one, text: one }))}
                value={chosen.basis}
                onChoose={(basis) => choose({ basis })}
              />
            ) : null}
          </div>
          <StoryPlan
            document={document}
            width={drawnWidth}
            chosen={{ ...chosen, variant: choice.variant }}
            shares={shares}
            drift={drifts.find((one) => one.level === level.level)}
            massName={massName}
            wall={wall}
            onChooseWall={chooseWall}
          />
        </div>
        <BasesTable
          bases={bases}
          units={units}
          level={level.level}
          caseName={chosen.case}
          chosenBasis={chosen.basis}
          onChooseBasis={(basis) => choose({ basis })}
          chosenWall={wall}
          onChooseWall={chooseWall}
        >
          <p className="note mt-2 max-w-[68ch] pl-2">{sayUse(document)}</p>
        </BasesTable>
      </div>
      <div className="mt-4 grid items-start gap-5 min-[1400px]:grid-cols-[690px_minmax(0,1fr)] print:grid-cols-[690px_minmax(0,1fr)]">
        <ShareTable
          shares={shares}
          units={units}
          level={level.level}
          caseName={chosen.case}
          basis={chosen.basis}
          chosenWall={wall}
          onChooseWall={chooseWall}
        />
        {balances.length > 0 ? (
          <BalanceTable
            balances={balances}
            residuals={basisResiduals(document, chosen)}
            lost={lost}
            title={`Balance, ${level.level}, ${chosen.case}`}
            units={units}
          >
            <RecomputeLine comparison={comparison} />
          </BalanceTable>
        ) : null}
      </div>
      <div className="mt-4 grid gap-4">
        {wall !== null && bases.bases.length > 1 ? (
          <WallBasesSection
            wall={wall}
            caseText={`${chosen.case}${chosen.variants.length > 1 ? `, ${variantText}` : ''}`}
            down={down}
            bases={bases.bases}
            rows={wallUnderBases(document, down, wall, { ...inView, bases: bases.bases })}
            units={units}
            chosenLevel={level.level}
            onChooseLevel={chooseLevel}
          />
        ) : null}
        <DriftTable
          rows={drifts}
          total={totalWindDrift(document)}
          caseText={`${chosen.case}${chosen.variants.length > 1 ? `, ${variantText}` : ''}`}
          warnings={document.warnings}
          chosenLevel={level.level}
          onChooseLevel={chooseLevel}
        />
        <RigidityPanel buildingId={id} level={level.level} chosenWall={wall} onChooseWall={chooseWall} />
        <WarningList buildingId={id} warnings={weighWarnings(document)} />
      </div>
    </PageFrame>
  );
}

/** What the building does with the bases that it has. */
function sayUse({ basis, warnings }: ResultDocument): string {
  const own = basis.filter((one) => one !== 'envelope');
  if (own.length < 2) return `The building has one basis, ${own[0] ?? ''}. Another can be added in its settings.`;
  const left = warnings.filter((one) => one.code === 'basis-unavailable').map((one) => ` ${one.message}`);
  const use = basis.includes('envelope')
    ? 'The envelope is in use: of each check the worst basis is listed, never mixed between bases.'
    : 'Every check runs for each basis and the worse governs. The envelope lists the worst of each check on its own.';
  return `${use}${left.join('')}`;
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
