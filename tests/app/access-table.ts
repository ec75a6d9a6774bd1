import type { Role } from '@/lib/db/database';

/**
 * Who gets what answer from each route and page: the one table that the tests visit.
 *
 * A new route.ts or page.tsx needs a row here, or the build fails. Give the address with the names of `PlannedGarden`'s ids in
 * braces, a body where it needs one, and the status for a stranger and for each role. `strangers` are those with no part in the
 * garden: a removed member and somebody of another garden; both get the same answer as for a garden that does not exist.
 */
export interface RouteRow {
  file: string;
  method: 'GET' | 'POST' | 'PATCH' | 'DELETE';
  body?: (ids: Record<string, string>) => unknown;
  query?: string;
  anonymous: number;
  /** Everybody signed in, or by role. */
  signedIn?: number;
  roles?: Record<Role, number>;
  strangers?: number;
}

const all = (status: number): Record<Role, number> => ({
  owner: status,
  planner: status,
  tender: status,
  viewer: status,
});
const planners = (status: number): Record<Role, number> => ({
  owner: status,
  planner: status,
  tender: 403,
  viewer: 403,
});
const owners = (status: number): Record<Role, number> => ({ owner: status, planner: 403, tender: 403, viewer: 403 });

const api = 'app/api/v1';
const garden = `${api}/gardens/[gardenId]`;
const inGarden = { anonymous: 401, strangers: 404 };

const room = {
  name: 'Another',
  place: { latitudeDeg: 50, longitudeDeg: 8, timeZone: 'Europe/Berlin', altitudeM: 100 },
  climate: { airTempC: { kind: 'constant', value: 14 } },
  power: { supplyV: 230, circuits: [], tariff: null },
};
const lamp = {
  name: 'Bulb',
  spec: { inputPowerW: 12, rating: { kind: 'watts' }, shape: 'point', distribution: { type: 'isotropic' } },
};
const stale = { version: 999_999 };

/** A version that nobody has seen: allowed callers get 409 and nothing is changed. */
export const routes: RouteRow[] = [
  { file: `${api}/accounts/route.ts`, method: 'POST', body: () => ({}), anonymous: 422, signedIn: 422 },
  { file: `${api}/account/route.ts`, method: 'GET', anonymous: 401, signedIn: 200 },
  { file: `${api}/account/route.ts`, method: 'PATCH', body: () => ({}), anonymous: 401, signedIn: 200 },
  {
    file: `${api}/account/password/route.ts`,
    method: 'POST',
    body: () => ({ current: 'wrong', next: 'fifteen letters and more' }),
    anonymous: 401,
    signedIn: 422,
  },
  { file: `${api}/crops/route.ts`, method: 'GET', anonymous: 401, signedIn: 200 },
  {
    file: `${api}/evaluate/route.ts`,
    method: 'POST',
    body: () => ({ schema: 'nothing' }),
    anonymous: 422,
    signedIn: 422,
  },
  { file: `${api}/gardens/route.ts`, method: 'GET', anonymous: 401, signedIn: 200 },
  {
    file: `${api}/gardens/route.ts`,
    method: 'POST',
    body: () => ({ name: '', currency: 'EUR' }),
    anonymous: 401,
    signedIn: 422,
  },
  {
    file: `${api}/gardens/join/route.ts`,
    method: 'POST',
    body: () => ({ code: 'AAAAA-BBBBB' }),
    anonymous: 401,
    signedIn: 422,
  },
  { file: `${garden}/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  {
    file: `${garden}/route.ts`,
    method: 'PATCH',
    body: () => ({ ...stale, name: 'x' }),
    ...inGarden,
    roles: owners(409),
  },
  { file: `${garden}/members/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  {
    file: `${garden}/members/[accountId]/route.ts`,
    method: 'PATCH',
    body: () => ({ role: 'viewer' }),
    ...inGarden,
    roles: owners(200),
  },
  { file: `${garden}/join-codes/route.ts`, method: 'GET', ...inGarden, roles: owners(200) },
  {
    file: `${garden}/join-codes/route.ts`,
    method: 'POST',
    body: () => ({ role: 'viewer' }),
    ...inGarden,
    roles: owners(201),
  },
  { file: `${garden}/rooms/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  { file: `${garden}/rooms/route.ts`, method: 'POST', body: () => room, ...inGarden, roles: planners(201) },
  { file: `${garden}/rooms/[roomId]/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  {
    file: `${garden}/rooms/[roomId]/route.ts`,
    method: 'PATCH',
    body: () => ({ ...stale, name: 'x' }),
    ...inGarden,
    roles: planners(409),
  },
  { file: `${garden}/rooms/[roomId]/route.ts`, method: 'DELETE', ...inGarden, roles: planners(409) },
  { file: `${garden}/tents/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  {
    file: `${garden}/tents/route.ts`,
    method: 'POST',
    body: ({ roomId }) => ({ roomId, name: 'Second', body: { widthM: 1, depthM: 1, heightM: 2 }, tierCount: 1 }),
    ...inGarden,
    roles: planners(201),
  },
  { file: `${garden}/tents/[tentId]/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  {
    file: `${garden}/tents/[tentId]/route.ts`,
    method: 'PATCH',
    body: () => ({ ...stale, name: 'x' }),
    ...inGarden,
    roles: planners(409),
  },
  { file: `${garden}/tents/[tentId]/scenarios/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  {
    file: `${garden}/tents/[tentId]/scenarios/route.ts`,
    method: 'POST',
    body: () => ({ name: 'New' }),
    ...inGarden,
    roles: planners(201),
  },
  { file: `${garden}/fixtures/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  { file: `${garden}/fixtures/route.ts`, method: 'POST', body: () => lamp, ...inGarden, roles: planners(201) },
  { file: `${garden}/fixtures/[fixtureId]/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  {
    file: `${garden}/fixtures/[fixtureId]/route.ts`,
    method: 'PATCH',
    body: () => ({ ...stale, name: 'x' }),
    ...inGarden,
    roles: planners(409),
  },
  { file: `${garden}/fixtures/[fixtureId]/route.ts`, method: 'DELETE', ...inGarden, roles: planners(409) },
  { file: `${garden}/targets/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  {
    file: `${garden}/targets/route.ts`,
    method: 'POST',
    body: () => ({ crop: 'x', stage: 'y', figures: { dliTargetMolM2D: 12, dliLowMolM2D: 20 } }),
    ...inGarden,
    roles: all(422),
  },
  {
    file: `${garden}/targets/[targetId]/route.ts`,
    method: 'PATCH',
    body: () => ({ ...stale, note: 'x' }),
    ...inGarden,
    roles: planners(409),
  },
  { file: `${garden}/scenarios/[scenarioId]/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  {
    file: `${garden}/scenarios/[scenarioId]/route.ts`,
    method: 'PATCH',
    body: () => ({ ...stale, name: 'x' }),
    ...inGarden,
    roles: planners(409),
  },
  {
    file: `${garden}/scenarios/[scenarioId]/copy/route.ts`,
    method: 'POST',
    body: () => ({}),
    ...inGarden,
    roles: planners(201),
  },
  { file: `${garden}/scenarios/[scenarioId]/evaluation/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  { file: `${garden}/scenarios/[scenarioId]/document/route.ts`, method: 'GET', ...inGarden, roles: all(200) },
  { file: `${garden}/comparison/route.ts`, method: 'GET', query: '?ids={scenarioId}', ...inGarden, roles: all(200) },
  {
    file: `${garden}/comparison/csv/route.ts`,
    method: 'GET',
    query: '?ids={scenarioId}',
    ...inGarden,
    roles: all(200),
  },
  // What takes rows away comes last, in the order in which it can.
  {
    file: `${garden}/targets/[targetId]/route.ts`,
    method: 'DELETE',
    ...inGarden,
    roles: { owner: 204, planner: 404, tender: 403, viewer: 403 },
  },
  { file: `${garden}/join-codes/[joinCodeId]/route.ts`, method: 'DELETE', ...inGarden, roles: owners(204) },
  {
    file: `${garden}/scenarios/[scenarioId]/route.ts`,
    method: 'DELETE',
    ...inGarden,
    roles: { owner: 204, planner: 404, tender: 403, viewer: 403 },
  },
  {
    file: `${garden}/tents/[tentId]/route.ts`,
    method: 'DELETE',
    ...inGarden,
    roles: { owner: 204, planner: 404, tender: 403, viewer: 403 },
  },
  {
    file: `${garden}/members/[accountId]/route.ts`,
    method: 'DELETE',
    ...inGarden,
    roles: { owner: 204, planner: 403, tender: 403, viewer: 403 },
  },
  {
    file: `${garden}/route.ts`,
    method: 'DELETE',
    ...inGarden,
    roles: { owner: 204, planner: 404, tender: 403, viewer: 403 },
  },
  { file: `${api}/account/sessions/route.ts`, method: 'DELETE', anonymous: 401, signedIn: 204 },
];

/** Routes that are not the API's own: next-auth's, and the two that tell whether the server lives. */
export const otherRoutes = ['app/api/auth/[...nextauth]/route.ts', 'app/livez/route.ts', 'app/readyz/route.ts'];
