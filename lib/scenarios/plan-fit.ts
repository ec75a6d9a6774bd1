import { parseScenarioDocument, type DocumentProblem } from '../evaluation/problems';
import { toScenarioDocument } from '../evaluation/scenario-document';
import type { Fixture } from '../fixtures/fixture.schema';
import type { Room } from '../rooms/room.schema';
import type { Tent } from '../tents/tent.schema';
import type { Plan } from './plan.schema';

interface Parts {
  plan: Plan;
  tent: Pick<Tent, 'body'>;
  room: Pick<Room, 'place' | 'climate' | 'power'>;
  fixtures: readonly Fixture[];
}

/** Where a problem of the whole document stands in the plan that was sent. */
function pathInPlan(path: string, plan: Plan): string {
  const [head = ''] = path.split(/[.[]/, 1);
  if (head in plan) return `plan.${path}`;
  if (head === 'power') return 'plan.circuitLoads';
  // The only thing that a plan says of its room's climate is the year of its hours.
  return head === 'room' ? 'plan.calendar' : path;
}

/** All that keeps a plan from being evaluated in its tent and room, by the one schema of the whole document. */
export function problemsOfPlan({ plan, tent, room, fixtures }: Parts): DocumentProblem[] {
  const document = toScenarioDocument({
    name: 'plan',
    plan,
    tent,
    room,
    fixtures,
    targets: [],
    referenceTariff: { tariff: { kind: 'flat', currency: 'EUR', pricePerKwh: 0 }, source: '', standing: 'given' },
    otherLoads: {},
  });
  const parsed = parseScenarioDocument(document);
  if (parsed.ok) return [];
  return parsed.problems.map((problem) => ({ ...problem, path: pathInPlan(problem.path, plan) }));
}
