import type { FixtureSpec } from '../fixtures/fixture.schema';
import type { RoomInput } from '../rooms/room.schema';
import type { Plan } from '../scenarios/plan.schema';
import type { TentBody } from '../evaluation/evaluate-scenario';
import type { Role, UnitSystem } from '../db/database';

/** A person of the demo. All of them are invented, and so is everything that they plan. */
export interface DemoPerson {
  name: string;
  email: string;
  passphrase: string;
  unitSystem: UnitSystem;
  role: Role;
}

export interface DemoScenario {
  name: string;
  note: string;
  /** Lamps are named by their key in `fixtures`. */
  plan: Plan;
}

export interface DemoGarden {
  name: string;
  currency: string;
  people: [owner: DemoPerson, ...others: DemoPerson[]];
  fixtures: Record<string, { name: string; spec: FixtureSpec }>;
  room: Omit<RoomInput, 'roomId'>;
  tent: { name: string; body: TentBody };
  /** The first is in use. */
  scenarios: [DemoScenario, ...DemoScenario[]];
}
