import type { StoredRow } from '#shared/contracts/tables';

import type { RowRecord } from '../../db/repositories/TableRepository.ts';

/** A row as it leaves the house: the cells beside id and version. */
export const storedRow = ({ id, version, cells }: RowRecord): StoredRow =>
  ({ ...cells, id, version }) as unknown as StoredRow;
