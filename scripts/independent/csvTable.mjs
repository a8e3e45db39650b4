import { headerUnit, ownUnits } from './siUnits.mjs';

/** Columns that hold numbers, and what they measure; every other column is text. */
const quantities = {
  levels: {
    height: 'length',
    elevation: 'length',
    x: 'length',
    y: 'length',
    extentx: 'length',
    extenty: 'length',
    edgex: 'length',
    edgey: 'length',
    weight: 'force',
    gravity: 'force',
  },
  walls: {
    x1: 'length',
    y1: 'length',
    x2: 'length',
    y2: 'length',
    thickness: 'thickness',
    fc: 'strength',
    sharex: 'plain',
    sharey: 'plain',
    opening: 'plain',
    flexurefactor: 'plain',
    shearfactor: 'plain',
  },
  forces: { fx: 'force', fy: 'force', x: 'length', y: 'length', mz: 'moment' },
  gravity: {
    dead: 'force',
    live: 'force',
    rooflive: 'force',
    snow: 'force',
    tributaryarea: 'area',
    eccentricity: 'length',
  },
  combinations: {},
  overrides: { shear: 'force', axial: 'force', moment: 'moment', share: 'plain' },
};

/** Records of a delimited text with quoted fields. */
function records(text, delimiter) {
  const out = [[]];
  let field = '';
  let quoted = false;
  for (let i = 0; i < text.length; i += 1) {
    const character = text[i];
    if (quoted) {
      if (character === '"' && text[i + 1] === '"') {
        field += '"';
        i += 1;
      } else if (character === '"') quoted = false;
      else field += character;
    } else if (character === '"' && field === '') quoted = true;
    else if (character === delimiter) {
      out.at(-1).push(field);
      field = '';
    } else if (character === '\n') {
      out.at(-1).push(field);
      field = '';
      out.push([]);
    } else field += character;
  }
  out.at(-1).push(field);
  return out.filter((record) => record.some((value) => value.trim() !== ''));
}

function numberOf(text) {
  const value = Number(text.replaceAll(/[,\s]/g, ''));
  if (!Number.isFinite(value)) throw new Error(`${text} is no number`);
  return value;
}

/** Rows of one table as plain objects in newtons and meters; an empty cell is undefined. */
export function readCsvTable(name, raw, system) {
  const text = raw.replace(/^\uFEFF/, '').replaceAll(/\r\n?/g, '\n');
  const head = text.slice(0, text.indexOf('\n'));
  const delimiter = [',', ';', '\t'].sort((a, b) => head.split(b).length - head.split(a).length)[0];
  const [header, ...rows] = records(text, delimiter);
  const columns = header.map((cell) => {
    const [, title, unit] = /^(.*?)\s*(?:[[(](.+)[\])])?\s*$/.exec(cell.trim());
    const key = title.toLowerCase().replaceAll(/[\s_]/g, '');
    const quantity = quantities[name][key];
    const size = quantity === undefined ? null : unit ? headerUnit(unit.trim()) : (ownUnits[system][quantity] ?? 1);
    return { key, size };
  });
  return rows.map((cells) => {
    const row = {};
    columns.forEach(({ key, size }, index) => {
      const cell = (cells[index] ?? '').trim();
      if (cell === '') return;
      row[key] = size === null ? cell : numberOf(cell) * size;
    });
    return row;
  });
}
