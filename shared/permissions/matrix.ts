/**
 * Who may call what: the one truth that the router, the client and the matrix test read. `stranger` is signed in but not of this
 * building (another office, or not a member); `nobody` has no session. The numbers are the status of a call that is otherwise in
 * order; a route that is not in this list can't be registered.
 */

export const callers = ['admin', 'engineer', 'checker', 'drafter', 'stranger', 'nobody'] as const;
export type CallerKind = (typeof callers)[number];

export type HttpMethod = 'GET' | 'POST' | 'PUT' | 'PATCH' | 'DELETE';

export interface MatrixLine {
  readonly action: string;
  readonly method: HttpMethod;
  readonly path: string;
  readonly answers: Readonly<Record<CallerKind, number>>;
}

type Answers = readonly [
  admin: number,
  engineer: number,
  checker: number,
  drafter: number,
  stranger: number,
  nobody: number,
];

const line = <A extends string, P extends string>(
  action: A,
  method: HttpMethod,
  path: P,
  [admin, engineer, checker, drafter, stranger, nobody]: Answers,
) => ({ action, method, path, answers: { admin, engineer, checker, drafter, stranger, nobody } }) as const;

const open: Answers = [200, 200, 200, 200, 200, 200];
const anyone: Answers = [200, 200, 200, 200, 200, 401];
const readers: Answers = [200, 200, 200, 403, 404, 401];
const engineers = (done: number): Answers => [403, done, 403, 403, 404, 401];

export const matrix = [
  line('health.read', 'GET', '/api/health', open),
  line('ready.read', 'GET', '/api/ready', open),
  line('session.open', 'POST', '/api/session', open),
  line('session.read', 'GET', '/api/session', anyone),
  line('session.close', 'DELETE', '/api/session', [204, 204, 204, 204, 204, 401]),
  line('buildings.list', 'GET', '/api/buildings', anyone),
  // a stranger is an engineer of another office, who creates there
  line('buildings.create', 'POST', '/api/buildings', [403, 201, 403, 403, 201, 401]),
  line('building.read', 'GET', '/api/buildings/:id', readers),
  line('building.edit', 'PATCH', '/api/buildings/:id', engineers(200)),
  line('building.delete', 'DELETE', '/api/buildings/:id', engineers(204)),
  line('upload.take', 'POST', '/api/buildings/:id/uploads', engineers(200)),
  line('levels.read', 'GET', '/api/buildings/:id/levels', readers),
  line('levels.replace', 'PUT', '/api/buildings/:id/levels', engineers(200)),
  line('levels.edit', 'PATCH', '/api/buildings/:id/levels', engineers(200)),
  line('walls.read', 'GET', '/api/buildings/:id/walls', readers),
  line('walls.replace', 'PUT', '/api/buildings/:id/walls', engineers(200)),
  line('walls.edit', 'PATCH', '/api/buildings/:id/walls', engineers(200)),
  line('forces.read', 'GET', '/api/buildings/:id/forces', readers),
  line('forces.replace', 'PUT', '/api/buildings/:id/forces', engineers(200)),
  line('forces.edit', 'PATCH', '/api/buildings/:id/forces', engineers(200)),
  line('gravity.read', 'GET', '/api/buildings/:id/gravity', readers),
  line('gravity.replace', 'PUT', '/api/buildings/:id/gravity', engineers(200)),
  line('gravity.edit', 'PATCH', '/api/buildings/:id/gravity', engineers(200)),
  line('combinations.read', 'GET', '/api/buildings/:id/combinations', readers),
  line('combinations.replace', 'PUT', '/api/buildings/:id/combinations', engineers(200)),
  line('combinations.edit', 'PATCH', '/api/buildings/:id/combinations', engineers(200)),
  line('overrides.read', 'GET', '/api/buildings/:id/overrides', readers),
  line('overrides.replace', 'PUT', '/api/buildings/:id/overrides', engineers(200)),
  line('overrides.edit', 'PATCH', '/api/buildings/:id/overrides', engineers(200)),
  line('results.read', 'GET', '/api/buildings/:id/results', readers),
  line('schedule.read', 'GET', '/api/buildings/:id/schedule', readers),
  line('schedule.edit', 'PATCH', '/api/buildings/:id/schedule/:rowId', engineers(200)),
  line('acknowledgments.read', 'GET', '/api/buildings/:id/acknowledgments', readers),
  line('acknowledgments.add', 'POST', '/api/buildings/:id/acknowledgments', engineers(201)),
  line('workbook.read', 'GET', '/api/buildings/:id/schedule.xlsx', readers),
  line('edit.undo', 'POST', '/api/buildings/:id/undo', engineers(200)),
] satisfies readonly MatrixLine[];

export type Action = (typeof matrix)[number]['action'];
export type RoutePath = (typeof matrix)[number]['path'];
