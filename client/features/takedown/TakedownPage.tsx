import { useState, type ReactElement } from 'react';

import { unitLabels } from '#shared/contracts/quantities';
import type { ResultDocument, ResultTransferred } from '#shared/contracts/result';
import type { TableResource } from '#shared/contracts/tables';
import { basisOrder } from '#shared/drawing/basisStyles';
import { placeStackWalls } from '#shared/drawing/placeStackWalls';
import type { WallRow } from '#shared/engineering/input';
import { forceDecimals, formatForce, formatMoment } from '#shared/format/force';
import { formatBarLength, formatPlanLength, formatProseLength } from '#shared/format/length';

import { bandAt } from '../../app/bandAt.ts';
import { PageFrame } from '../../app/PageFrame.tsx';
import { useBuildingId } from '../../app/useBuildingId.ts';
import { useChoice } from '../../app/useChoice.ts';
import { DownTheHeight } from '../../components/drawing/DownTheHeight.tsx';
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
import { Segments } from '../../components/ui/Segments.tsx';
import { StateNote } from '../../components/ui/StateNote.tsx';
import { weighWarnings } from '../../components/warnings/heldRows.ts';
import { WarningList } from '../../components/warnings/WarningList.tsx';
import { useBuilding, useTable } from '../../data/queries.ts';
import { AssignedSection } from './AssignedSection.tsx';
import { caseReactions } from './caseReactions.ts';
import { CaseReactionTable } from './CaseReactionTable.tsx';
import { collectorRows } from './collectors.ts';
import { CollectorTable } from './CollectorTable.tsx';
import { foundationRows } from './foundation.ts';
import { FoundationTable } from './FoundationTable.tsx';
import { governing } from './governing.ts';
import { GovernsTable } from './GovernsTable.tsx';
import { heightDiagrams } from './heightDiagrams.ts';
import { ReactionTable } from './ReactionTable.tsx';
import { baseReactions, baseShearSum } from './reactions.ts';
import { sayDead } from './sayDead.ts';
import { sayGravityBalance } from './sayGravityBalance.ts';
import { ShareSteps } from './ShareSteps.tsx';
import { shareSteps } from './shareSteps.ts';
import { StoryTable } from './StoryTable.tsx';
import { gravityCases, variantOf, wallStories } from './wallStories.ts';

/** walls that start above the base or stop below the roof: there a takedown has to be looked at by hand */
const warningsOfTakedown = ['transfer-not-assigned', 'wall-stops-below-roof'];

/** What comes down each wall, story by story, to its foot. */
export function TakedownPage(): ReactElement {
  const id = useBuildingId();
  const [choice] = useChoice();
  return (
    <ResultGate buildingId={id} page="Takedown">
      {(document, walls) => {
        const chosen = resultChoice(document, choice);
        const names = [...new Set(walls.rows.map((row) => row.wall))];
        if (chosen === null) return <NoForces />;
        const wall =
          names.find((name) => name === choice.wall) ??
          leadingWall(document, { ...chosen, basis: chosen.bases[0] ?? chosen.basis }) ??
          names[0];
        if (wall === undefined) return <NoForces />;
        return <Shown id={id} document={document} walls={walls} chosen={chosen} wall={wall} names={names} />;
      }}
    </ResultGate>
  );
}

function NoForces(): ReactElement {
  return (
    <PageFrame title="Takedown">
      <StateNote art="empty" place="Takedown, no forces yet" title="No forces yet">
        <p>Levels and walls stand. Bring forces and gravity, and what comes down each wall stands here.</p>
      </StateNote>
    </PageFrame>
  );
}

interface ShownProps {
  id: string;
  document: ResultDocument;
  walls: TableResource<'walls'>;
  chosen: ResultChoice;
  wall: string;
  names: readonly string[];
}

function Shown({ id, document, walls, chosen, wall, names }: ShownProps): ReactElement {
  const [, choose] = useChoice();
  const { units } = document;
  const [hovered, setHovered] = useState<string | null>(null);
  const building = useBuilding(id).data;
  const gravity = useTable(id, 'gravity').data?.rows;
  const overrides = useTable(id, 'overrides').data?.rows;
  const accidental = building?.accidental ?? 0;
  const down = levelsDown(document);
  const bases = basisOrder.filter((one) => chosen.bases.includes(one));
  const stories = wallStories(document, down, wall, chosen);
  const reactions = baseReactions(document, down, names, chosen);
  const chooseWall = (name: string): void => choose({ wall: name });
  useWallKey(names, wall, chooseWall);
  const cases = chosen.cases.map((name) => {
    const variant = variantOf(document, name, chosen.variant);
    return { name, variant: variant === '0' ? '' : sayVariant(variant, accidental) };
  });
  const force = unitLabels.force[units];
  const shears = stories.map((story) => story.lateral.get(chosen.case)?.shear ?? null);
  const decimals = forceDecimals(shears.map((shear) => shear ?? 0));
  const steps = shareSteps(document, wall, chosen, accidental);
  const unit = units === 'us' ? 'ft' : 'm';
  const caseText = `${chosen.case}${chosen.variant === '0' ? '' : `, ${sayVariant(chosen.variant, accidental)}`}, ${chosen.basis}`;
  const feet = reactions.map(({ wall: name, level, atBase }) => {
    const row = bandAt(document.levels, walls.rows, name, level);
    return { wall: name, level, atBase, length: row ? lengthOf(row) : 0 };
  });
  const foot = reactions.find((one) => one.wall === wall);
  const sayOwnDead =
    foot && building && gravity ? sayDead(foot.gravity.D, gravity, wall, building.selfWeight, units) : '';
  return (
    <PageFrame
      title={`Takedown, wall ${wall}`}
      sub={`${sayWall(walls.rows, wall, units)} Bottom of each story; compression positive.`}
      actions={
        <>
          <label className="flex items-center gap-2 text-data font-medium">
            Wall
            <select
              className="gw-input gw-input-low w-auto min-w-[72px]"
              value={wall}
              onChange={(event) => chooseWall(event.target.value)}
            >
              {names.map((name) => (
                <option key={name}>{name}</option>
              ))}
            </select>
          </label>
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
              options={bases.map((one) => ({ value: one, text: one }))}
              value={chosen.basis}
              onChoose={(basis) => choose({ basis })}
            />
          ) : null}
        </>
      }
      stackTitle={chosen.level.level}
      stackSub={`elevation ${formatPlanLength(chosen.level.elevation, units)} ${unit}, story ${formatPlanLength(chosen.level.height, units)} ${unit}`}
      stack={
        <Stack
          stories={down.map((level, index) => ({
            level: level.level,
            elevation: level.elevation,
            height: level.height,
            value: shears[index] ?? null,
            text: shears[index] === null || shears[index] === undefined ? '–' : formatForce(shears[index], decimals),
          }))}
          walls={placeStackWalls(down, walls.rows)}
          caption={`Wall shear ${chosen.case}, ${wall}`}
          unit={force}
          units={units}
          chosen={chosen.level.level}
          onChoose={(level) => choose({ level })}
          chosenWall={wall}
        />
      }
      keys={[
        { keys: ['↑', '↓'], does: 'story' },
        { keys: ['W'], does: 'next wall' },
      ]}
    >
      <div className="grid gap-x-5 gap-y-4 min-[1400px]:grid-cols-[704px_minmax(0,1fr)] print:grid-cols-[704px_minmax(0,1fr)]">
        <DownTheHeight
          diagrams={heightDiagrams(document, down, wall, chosen, hovered ?? chosen.level.level)}
          chosen={chosen.level.level}
          sayStory={(name) => sayStory(document, wall, name, chosen)}
          onChoose={(level) => choose({ level })}
          onHover={setHovered}
        />
        <div className="min-w-0">
          <GovernsTable
            title={`${wall} at ${hovered ?? chosen.level.level}, what governs under ${chosen.basis}`}
            rows={governing(document, wall, hovered ?? chosen.level.level, chosen.basis)}
            units={units}
          />
          <ReactionTable
            reactions={reactions}
            shearSum={baseShearSum(document, down, reactions, walls.rows, chosen.case)}
            caseText={caseText}
            balanceText={`${sayOwnDead} ${sayGravityBalance(document, chosen.basis, down.at(-1)?.level ?? '')}`}
            units={units}
            chosenWall={wall}
            onChooseWall={chooseWall}
          />
          {steps.length > 0 ? (
            <ShareSteps title={`${wall} at ${chosen.level.level}, its share`} steps={steps} units={units} />
          ) : null}
        </div>
      </div>
      <div className="mt-4">
        <StoryTable
          wall={wall}
          stories={stories}
          cases={cases}
          units={units}
          chosenLevel={chosen.level.level}
          onChooseLevel={(level) => choose({ level })}
        />
      </div>
      <div className="mt-4 grid gap-4">
        <FoundationTable
          rows={foundationRows(document, feet)}
          units={units}
          chosenWall={wall}
          onChooseWall={chooseWall}
        />
        {foot === undefined ? null : (
          <CaseReactionTable
            wall={wall}
            level={foot.level}
            rows={caseReactions(document, wall, foot.level, bases)}
            bases={bases}
            accidental={accidental}
            units={units}
          />
        )}
        <CollectorTable
          rows={collectorRows(document, down, names, walls.rows, chosen)}
          names={names}
          caseText={caseText}
          units={units}
          chosenWall={wall}
          chosenLevel={chosen.level.level}
          onChooseLevel={(level) => choose({ level })}
        />
        <AssignedSection
          overrides={overrides ?? []}
          transferred={document.transferred.filter((one) => transferInView(one, chosen))}
          units={units}
        />
        <WarningList
          buildingId={id}
          warnings={weighWarnings(document).filter(({ warning }) => warningsOfTakedown.includes(warning.code))}
        />
      </div>
    </PageFrame>
  );
}

const lengthOf = ({ x1, y1, x2, y2 }: WallRow): number => Math.sqrt((x2 - x1) * (x2 - x1) + (y2 - y1) * (y2 - y1));

/** of the basis, case and variant in view; gravity is the same under each and is listed with it */
const transferInView = (one: ResultTransferred, chosen: ResultChoice): boolean =>
  one.basis === chosen.basis &&
  (gravityCases.some((name) => name === one.case)
    ? one.axial !== 0 || one.moment !== 0
    : one.case === chosen.case && one.variant === chosen.variant);

/** Values of a story under the basis in view, for the list in the diagrams. */
function sayStory(document: ResultDocument, wall: string, level: string, chosen: ResultChoice): string {
  const found = document.lateral.find(
    (one) =>
      one.wall === wall &&
      one.level === level &&
      one.basis === chosen.basis &&
      one.case === chosen.case &&
      one.variant === chosen.variant,
  );
  if (!found) return `${level}, not standing`;
  const { units } = document;
  return `${level}, ${chosen.basis}, shear ${formatForce(found.shear)} ${unitLabels.force[units]}, moment ${formatMoment(found.moment)} ${unitLabels.moment[units]}`;
}

/** Where a wall stands in plan, how long it is, and how thick from its foot to its top. */
function sayWall(rows: readonly WallRow[], wall: string, units: 'us' | 'si'): string {
  const bands = rows.filter((row) => row.wall === wall);
  const first = bands[0];
  if (!first) return '';
  const print = (length: number): string => formatPlanLength(length, units);
  const length = lengthOf(first);
  const thick = [...new Set(bands.map((row) => formatBarLength(row.thickness, units)))].join(', ');
  const place = `(${print(first.x1)}, ${print(first.y1)}) to (${print(first.x2)}, ${print(first.y2)}) ${units === 'us' ? 'ft' : 'm'}`;
  return `From ${place}; ${formatProseLength(length, units)} long, ${thick} ${units === 'us' ? 'in' : 'mm'} thick.`;
}
