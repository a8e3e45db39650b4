import { readSettings } from '#shared/contracts/settings';

import type { Answers } from './fakeServer.ts';

/** A small invented building, as the API tells of it. */
const outcome = readSettings({ name: 'Tern Yard', number: '41', units: 'us' });
if (!outcome.ok) throw new Error('the sample settings are refused');

export const sampleBuilding = { ...outcome.settings, id: 'b1', state: 'in progress', seq: 7, version: 3 };

const level = (id: string, name: string, height: number) => ({
  id,
  version: 1,
  level: name,
  height,
  elevation: null,
  x: 30,
  y: 20,
  extent_x: 60,
  extent_y: 40,
  edge_x: null,
  edge_y: null,
  diaphragm: 'rigid',
  weight: null,
  gravity: null,
});

export const sampleLevels = [level('l3', 'Roof', 12), level('l2', 'L3', 11), level('l1', 'L2', 14.5)];

export const session = (role: string) => ({
  person: { id: 'p1', name: 'R. Vane', email: `${role}@demo.example`, role },
  office: { id: 'o1', name: 'Harbor Row' },
});

const empty = { body: { rows: [], version: 1, seq: 7 } };

export const sampleAnswers = (role = 'engineer'): Answers => ({
  'GET /api/session': { body: session(role) },
  'GET /api/buildings': {
    body: {
      rows: [
        {
          id: 'b1',
          name: 'Tern Yard',
          number: '41',
          units: 'us',
          code: 'aci318-19',
          state: 'in progress',
          seq: 7,
          version: 3,
          levels: 3,
          walls: 0,
          changedAt: '2026-11-30T09:00:00.000Z',
          changedBy: 'R. Vane',
        },
      ],
    },
  },
  'GET /api/buildings/b1': { body: sampleBuilding },
  'GET /api/buildings/b1/levels': { body: { rows: sampleLevels, version: 2, seq: 7 } },
  'GET /api/buildings/b1/walls': empty,
  'GET /api/buildings/b1/forces': empty,
  'GET /api/buildings/b1/gravity': empty,
  'GET /api/buildings/b1/combinations': empty,
  'GET /api/buildings/b1/overrides': empty,
  'GET /api/buildings/b1/acknowledgments': { body: { rows: [], seq: 7 } },
  'GET /api/buildings/b1/results': {
    status: 422,
    body: { error: { code: 'does-not-compute', message: 'walls has no rows', problems: [] } },
  },
});
