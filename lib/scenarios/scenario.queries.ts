import 'server-only';

import type { GardenTransaction } from '../db/transactions';
import { notFoundHere } from '../http/app-error';
import type { Plan } from './plan.schema';
import type { Scenario } from './scenario.schema';

const scenarioRows = (trx: GardenTransaction, gardenId: string) =>
  trx
    .selectFrom('scenarios')
    .leftJoin('accounts', 'accounts.account_id', 'scenarios.updated_by')
    .where('scenarios.garden_id', '=', gardenId)
    .select(['scenario_id', 'tent_id', 'name', 'note', 'plan', 'version', 'updated_at', 'accounts.display_name']);

type Row = Awaited<ReturnType<ReturnType<typeof scenarioRows>['executeTakeFirstOrThrow']>>;

const toScenario = (row: Row): Scenario => ({
  scenarioId: row.scenario_id,
  tentId: row.tent_id,
  name: row.name,
  note: row.note,
  plan: row.plan as Plan,
  version: row.version,
  updatedAt: row.updated_at.toISOString(),
  updatedByName: row.display_name,
});

export async function scenarioById(trx: GardenTransaction, gardenId: string, scenarioId: string): Promise<Scenario> {
  const row = await scenarioRows(trx, gardenId).where('scenario_id', '=', scenarioId).executeTakeFirst();
  if (!row) throw notFoundHere('scenario');
  return toScenario(row);
}

export async function scenariosOf(trx: GardenTransaction, gardenId: string, tentId?: string): Promise<Scenario[]> {
  let query = scenarioRows(trx, gardenId);
  if (tentId) query = query.where('tent_id', '=', tentId);
  return (await query.orderBy('scenarios.created_at').orderBy('scenario_id').execute()).map(toScenario);
}

/** Writes down which lamps a scenario hangs, so that none of them can be deleted under it. */
export async function linkFixtures(
  trx: GardenTransaction,
  gardenId: string,
  scenarioId: string,
  plan: Plan,
): Promise<void> {
  await trx
    .deleteFrom('scenario_fixtures')
    .where('garden_id', '=', gardenId)
    .where('scenario_id', '=', scenarioId)
    .execute();
  const used = [...new Set(plan.placements.map((placement) => placement.fixture))];
  if (used.length === 0) return;
  await trx
    .insertInto('scenario_fixtures')
    .values(used.map((fixtureId) => ({ garden_id: gardenId, scenario_id: scenarioId, fixture_id: fixtureId })))
    .execute();
}
