import { HttpError } from '../../http/HttpError.ts';

export interface MovedPlace {
  readonly table: string;
  readonly id: string;
  readonly column?: string;
  readonly stored?: unknown;
}

export const movedOn = (current: readonly MovedPlace[]): HttpError =>
  new HttpError(409, 'moved-on', 'The edit can not be undone: a cell has been changed since.', {
    current: current.slice(0, 500),
  });
