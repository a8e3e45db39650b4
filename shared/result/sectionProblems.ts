import type { SectionFile, SectionProblem } from '../contracts/section.ts';
import { barTables } from '../engineering/wall-design/bars.ts';

/** What one field of a section file can't tell: work not built yet, bar numbers against units, which bars are given, places outside. */
export function sectionProblems(file: SectionFile): SectionProblem[] {
  const problems: SectionProblem[] = [];
  const notYet = (column: string, asked: boolean, read: string, instead: string): void => {
    if (!asked) return;
    const message = `${column} reads ${read}, which is not designed yet; use ${instead}`;
    problems.push({ column, message, code: 'not-designed-yet' });
  };
  notYet('code', file.code === 'aci318-14', file.code, 'aci318-19');
  notYet('wallClass', file.wallClass === 'special', file.wallClass, 'ordinary');
  notYet('shearMethod', file.shearMethod === 'detailed', file.shearMethod, 'simplified');

  const numbers = barTables[file.units].map(({ number }) => number);
  for (const key of ['vertical', 'horizontal', 'ends', 'ties'] as const) {
    const read = file[key]?.bar;
    if (read === undefined || numbers.includes(read)) continue;
    problems.push({
      column: `${key}.bar`,
      message: `${key}.bar reads ${String(read)}, expected a bar of units ${file.units}: ${numbers.join(' ')}; correct it`,
    });
  }
  if (file.layers && (file.vertical || file.ends)) {
    problems.push({
      column: 'layers',
      message: 'layers stand beside vertical or ends, expected one way to give the bars; take one out',
    });
  }
  if (!file.layers && !file.vertical) {
    problems.push({
      column: 'vertical',
      message: 'vertical reads nothing, expected {curtains, bar, spacing}, or layers; give one',
    });
  }
  if (file.vertical && !file.horizontal) {
    problems.push({
      column: 'horizontal',
      message: 'horizontal reads nothing, expected {curtains, bar, spacing} beside vertical; give it',
    });
  }
  const lengthInBarUnits = file.length * (file.units === 'us' ? 12 : 1000);
  file.layers?.forEach(({ position }, index) => {
    if (position <= lengthInBarUnits) return;
    problems.push({
      column: `layers.${String(index)}.position`,
      message: `layers.${String(index)}.position reads ${String(position)}, expected 0 to the length of the section, ${String(lengthInBarUnits)}; correct it`,
    });
  });
  return problems;
}
