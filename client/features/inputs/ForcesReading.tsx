import type { BuildingResource } from '#shared/contracts/buildings';
import type { ForceRow, LevelRow } from '#shared/engineering/input';
import { formatNumber, thinSpace } from '#shared/format/number';

import { sentenceOf } from '../../app/errorSentences.ts';
import { Section } from '../../components/ui/Section.tsx';
import { Segments } from '../../components/ui/Segments.tsx';
import { usePatchBuilding } from '../../data/mutations.ts';
import { baseShears, differenceFrom } from './baseShears.ts';

export interface ForcesReadingProps {
  readonly building: BuildingResource;
  readonly levels: readonly LevelRow[];
  readonly forces: readonly ForceRow[];
  readonly canEdit: boolean;
}

const percent = (part: number): string => `${formatNumber(100 * part, Math.abs(part) < 0.1 ? 2 : 1)}${thinSpace}%`;

/** Asks what the typed numbers are, and shows the base shear that either answer gives beside the load sheet's. */
export function ForcesReading({ building, levels, forces, canEdit }: ForcesReadingProps) {
  const patch = usePatchBuilding(building.id);
  const { version, forcesAre, forceLevel, expectedBaseShear } = building;
  const unit = building.units === 'us' ? 'kip' : 'kN';
  const weight = levels.reduce((sum, row) => sum + (row.weight ?? 0), 0);
  const factors = { wind: '0.6', seismic: '0.7' } as const;
  return (
    <div className="mt-5">
      <Section title="What the forces are" aside={`base shears in ${unit}`}>
        <div className="flex flex-wrap items-center gap-x-4 gap-y-2 py-2">
          <Segments
            label="Forces are"
            options={[
              { value: 'level-force', text: 'Force at each level' },
              { value: 'story-shear', text: 'Story shear' },
            ]}
            value={forcesAre}
            disabled={!canEdit || patch.isPending}
            onChoose={(value) => patch.mutate({ version, forcesAre: value })}
          />
          <Segments
            label="Wind and seismic forces are at"
            options={[
              { value: 'strength', text: 'Strength' },
              { value: 'service', text: 'Service' },
            ]}
            value={forceLevel}
            disabled={!canEdit || patch.isPending}
            onChoose={(value) => patch.mutate({ version, forceLevel: value })}
          />
          {forceLevel === 'service' ? (
            <span className="note">
              {`Combinations and checks take W / ${factors.wind} and E / ${factors.seismic}; shares and drifts stay as typed.`}
            </span>
          ) : null}
        </div>
        {patch.error === null ? null : (
          <p className="gw-problem mb-2 font-medium" role="alert">
            {patch.error.problems[0]?.message ?? sentenceOf(patch.error)}
          </p>
        )}
        <table className="gw-table" aria-label="Base shears">
          <thead>
            <tr>
              <th scope="col">Case</th>
              <th scope="col" className="num">
                As forces at each level
              </th>
              <th scope="col" className="num">
                As story shears
              </th>
              <th scope="col" className="num">
                Of the weight
              </th>
              <th scope="col" className="num">
                Load sheet
              </th>
              <th scope="col" className="num">
                Differs
              </th>
            </tr>
          </thead>
          <tbody>
            {baseShears(levels, forces).map((shear) => {
              const used = forcesAre === 'level-force' ? shear.asLevelForces : shear.asStoryShears;
              const expected = expectedBaseShear[shear.case];
              const tone = (reading: typeof forcesAre) =>
                forcesAre === reading ? 'num font-semibold' : 'num text-graphite';
              return (
                <tr key={shear.case}>
                  <th scope="row">{shear.case}</th>
                  <td className={tone('level-force')}>{formatNumber(shear.asLevelForces, 1)}</td>
                  <td className={tone('story-shear')}>
                    {shear.asStoryShears === null ? 'no row at the lowest level' : formatNumber(shear.asStoryShears, 1)}
                  </td>
                  <td className="num">{weight > 0 && used !== null ? percent(Math.abs(used) / weight) : '–'}</td>
                  <td className="num">{expected === undefined ? '–' : formatNumber(expected, 1)}</td>
                  <td className="num">
                    {expected === undefined || used === null ? '–' : percent(differenceFrom(used, expected))}
                  </td>
                </tr>
              );
            })}
          </tbody>
        </table>
        <p className="note mt-1">
          {Object.keys(expectedBaseShear).length === 0
            ? 'The base shears of your load sheet stand in the settings, by case.'
            : 'A difference above 0.5 % from the load sheet is a warning.'}
        </p>
      </Section>
    </div>
  );
}
