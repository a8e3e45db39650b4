import { describe, expect, it } from 'vitest';

import { roles } from '../contracts/session.ts';

import { can } from './can.ts';
import { matrix } from './matrix.ts';

describe('can', () => {
  it('lets engineers alone edit', () => {
    expect(roles.filter((role) => can(role, 'schedule.edit'))).toEqual(['engineer']);
    expect(roles.filter((role) => can(role, 'upload.take'))).toEqual(['engineer']);
  });

  it('keeps drafters out of work in progress and lets the others read', () => {
    expect(roles.filter((role) => can(role, 'results.read'))).toEqual(['admin', 'engineer', 'checker']);
    expect(can('drafter', 'buildings.list')).toBe(true);
  });
});

describe('matrix', () => {
  it('names no action and no route twice', () => {
    expect(new Set(matrix.map((line) => line.action)).size).toBe(matrix.length);
    expect(new Set(matrix.map((line) => `${line.method} ${line.path}`)).size).toBe(matrix.length);
  });

  it('hides every building from strangers and everything but the open routes from nobody', () => {
    for (const line of matrix) {
      if (line.path.startsWith('/api/buildings/:id')) expect(line.answers.stranger).toBe(404);
      if (!['health.read', 'ready.read', 'session.open'].includes(line.action)) expect(line.answers.nobody).toBe(401);
    }
  });
});
