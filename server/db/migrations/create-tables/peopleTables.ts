import { boolean, id, integer, text, varchar, type TableText } from './tableText.ts';

/** Offices, people and their sessions, buildings and who may open them. In the order of creation. */
export const peopleTables: readonly TableText[] = [
  {
    name: 'office',
    columns: [id, varchar('name', 200), text('standards'), integer('version')],
  },
  {
    name: 'person',
    columns: [
      id,
      varchar('officeId', 36),
      varchar('email', 254),
      varchar('name', 200),
      varchar('role', 20),
      varchar('passwordHash', 200, true),
      boolean('active'),
      integer('version'),
    ],
    references: [['officeId', 'office', 'RESTRICT']],
    uniques: [['email']],
    indexes: [['officeId']],
  },
  {
    name: 'session',
    columns: [
      id,
      varchar('hash', 64),
      varchar('personId', 36),
      varchar('createdAt', 24),
      varchar('seenAt', 24),
      varchar('expiresAt', 24),
      varchar('revokedAt', 24, true),
    ],
    references: [['personId', 'person', 'CASCADE']],
    uniques: [['hash']],
    indexes: [['personId']],
  },
  {
    name: 'token',
    columns: [
      id,
      varchar('kind', 20),
      varchar('hash', 64),
      varchar('personId', 36),
      varchar('expiresAt', 24),
      varchar('usedAt', 24, true),
    ],
    references: [['personId', 'person', 'CASCADE']],
    uniques: [['hash']],
    indexes: [['personId']],
  },
  {
    name: 'building',
    columns: [
      id,
      varchar('officeId', 36),
      varchar('name', 200),
      varchar('number', 100),
      text('settings'),
      integer('seq'),
      integer('inputsSeq'),
      varchar('state', 30),
      varchar('access', 20),
      varchar('studyOf', 36, true),
      varchar('createdAt', 24),
      varchar('deletedAt', 24, true),
      integer('version'),
    ],
    references: [['officeId', 'office', 'RESTRICT']],
    indexes: [['officeId']],
  },
  {
    name: 'member',
    columns: [id, varchar('buildingId', 36), varchar('personId', 36)],
    references: [
      ['buildingId', 'building', 'CASCADE'],
      ['personId', 'person', 'CASCADE'],
    ],
    uniques: [['buildingId', 'personId']],
    indexes: [['personId']],
  },
];
