import { editableTables } from '#shared/contracts/tableColumns';

import type { Answers } from '../../app/testing/fakeServer.ts';
import { session } from '../../app/testing/sampleBuilding.ts';
import { sample, sampleResource, sampleTable } from './sampleBuilding.ts';

/** The computed sample building as the API tells of it. */
export const computedAnswers = (role = 'engineer'): Answers => ({
  'GET /api/session': { body: session(role) },
  'GET /api/buildings': { body: { rows: [] } },
  'GET /api/buildings/b1': { body: sampleResource },
  'GET /api/buildings/b1/results': { body: sample.document },
  'GET /api/buildings/b1/schedule': { body: { rows: sample.rows, seq: 7, orphans: [] } },
  ...Object.fromEntries(
    editableTables.map((table) => [`GET /api/buildings/b1/${table}`, { body: sampleTable(table) }]),
  ),
});
