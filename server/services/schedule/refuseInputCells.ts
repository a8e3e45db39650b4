import { HttpError } from '../../http/HttpError.ts';

/** Cells of a schedule row that are inputs of the wall: one truth for geometry. */
const inputCells: Readonly<Record<string, string>> = {
  thickness: 'thickness',
  fc: 'fc',
  from: 'from_level',
  to: 'to_level',
  wall: 'wall',
  levels: 'from_level',
};

export function refuseInputCells(body: unknown): void {
  if (typeof body !== 'object' || body === null) return;
  const found = Object.keys(body).filter((name) => Object.hasOwn(inputCells, name));
  if (found.length === 0) return;
  throw new HttpError(
    422,
    'input-cell',
    `${found.join(', ')} can not be overwritten here: change the row of the wall.`,
    {
      problems: found.map((name) => ({
        table: 'walls',
        row: null,
        column: inputCells[name] ?? name,
        message: `${name} comes from the inputs; change it in walls`,
      })),
    },
  );
}
