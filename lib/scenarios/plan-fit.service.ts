import 'server-only';

import type { GardenTransaction } from '../db/transactions';
import { fixturesOf } from '../fixtures/fixture.queries';
import { invalid } from '../http/app-error';
import type { DocumentProblem } from '../evaluation/problems';
import type { Room } from '../rooms/room.schema';
import type { Tent } from '../tents/tent.schema';
import { problemsOfPlan } from './plan-fit';
import type { Plan } from './plan.schema';
import { scenariosOf } from './scenario.queries';

/** What a problem is about, in words: a tier by its name, a lamp by the tier that it serves. */
function thingAt({ path }: DocumentProblem, plan: Plan): string | null {
  const [, list, index] = /^plan\.(tiers|placements|boxes)\[(\d+)\]/.exec(path) ?? [];
  if (list === 'tiers') return `The tier ${plan.tiers[Number(index)]?.name ?? Number(index) + 1}`;
  if (list === 'placements') return `Lamp ${Number(index) + 1}`;
  return list === 'boxes' ? `Box ${Number(index) + 1}` : null;
}

interface Change {
  tent: Tent;
  /** The room in which the tent stands, or is to stand. */
  room: Room;
  /** The field of the change that a refusal names. */
  path: string;
}

/** Refuses a change of tent or room under which a scenario of the tent could no longer be evaluated. */
export async function requireScenariosFit(
  trx: GardenTransaction,
  gardenId: string,
  { tent, room, path }: Change,
): Promise<void> {
  const fixtures = await fixturesOf(trx, gardenId);
  const problems = (await scenariosOf(trx, gardenId, tent.tentId)).flatMap(({ name, plan }) => {
    const [first] = problemsOfPlan({ plan, tent, room, fixtures });
    if (!first) return [];
    const thing = thingAt(first, plan);
    const message = thing
      ? `${thing} of “${name}” would not fit. Move it there first, or delete that scenario.`
      : `“${name}” would not fit: ${first.message}`;
    return [{ path, message }];
  });
  if (problems.length > 0) throw invalid(problems, 'A scenario would no longer fit.');
}
