import type { Warning } from '../input.ts';
import type { Analysis } from '../stages.ts';
import { listed } from '../stages.ts';

/**
 * `basis-spread`: walls whose base shear or moment under `rigid`, the largest over cases and variants, is more than 5 % below that
 * under `compatible`.
 */
export function basisWarnings(analysis: Analysis): Warning[] {
  const { model, actions, bases } = analysis;
  const rigid = bases.find(({ basis }) => basis === 'rigid');
  const compatible = bases.find(({ basis }) => basis === 'compatible');
  if (!rigid || !compatible) return [];
  const plane = model.stories.length * model.walls.length;
  return model.walls.flatMap((wall, wallIndex): Warning[] => {
    const largest = (column: Float64Array) =>
      actions.reduce((most, action, index) => {
        if (!listed(action, false)) return most;
        return Math.max(most, Math.abs(column[index * plane + wall.fromStory * model.walls.length + wallIndex] ?? 0));
      }, 0);
    const parts = [
      { word: 'shear', low: largest(rigid.shearKip), high: largest(compatible.shearKip) },
      { word: 'moment', low: largest(rigid.momentKipIn), high: largest(compatible.momentKipIn) },
    ].filter(({ low, high }) => low < 0.95 * high);
    if (parts.length === 0) return [];
    const said = parts.map(
      ({ word, low, high }) => `base ${word} ${Math.round(100 * (1 - low / high)).toFixed(0)} % lower`,
    );
    return [
      {
        code: 'basis-spread',
        level: model.stories[wall.fromStory]?.level ?? '',
        wall: wall.name,
        message: `${wall.name} under rigid: ${said.join(', ')} than under compatible. Every check runs for both and the worse governs.`,
      },
    ];
  });
}
