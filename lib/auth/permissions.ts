import type { Role } from '../db/database';

/**
 * Who may do what in a garden. The only place that decides; anything not listed is refused.
 *
 * Each role may do what stands in its rows and nothing by inheritance, so that the table can be read line by line.
 */
const everyone: readonly Role[] = ['owner', 'planner', 'tender', 'viewer'];
const planners: readonly Role[] = ['owner', 'planner'];
const owners: readonly Role[] = ['owner'];

export const permissions = {
  'garden.read': { roles: everyone, says: 'See the garden and all that is planned in it.' },
  'garden.update': { roles: owners, says: 'Rename the garden and set its currency.' },
  'garden.delete': { roles: owners, says: 'Delete the garden with everything in it.' },
  'garden.leave': { roles: everyone, says: 'Leave the garden.' },
  'member.read': { roles: everyone, says: 'See who belongs to the garden.' },
  'member.update': { roles: owners, says: 'Change what another person may do.' },
  'member.remove': { roles: owners, says: 'Remove a person from the garden.' },
  'joinCode.read': { roles: owners, says: 'See which join codes are open.' },
  'joinCode.create': { roles: owners, says: 'Make a one-use code for somebody to join with.' },
  'joinCode.delete': { roles: owners, says: 'Take a join code back.' },
  'room.read': { roles: everyone, says: 'See the rooms.' },
  'room.create': { roles: planners, says: 'Add a room.' },
  'room.update': { roles: planners, says: 'Change a room: its climate, place, circuits and tariff.' },
  'room.delete': { roles: planners, says: 'Delete an empty room.' },
  'tent.read': { roles: everyone, says: 'See the tents.' },
  'tent.create': { roles: planners, says: 'Add a tent.' },
  'tent.update': { roles: planners, says: 'Change a tent: its size, lining and which scenario is in use.' },
  'tent.delete': { roles: planners, says: 'Delete a tent with its scenarios.' },
  'fixture.read': { roles: everyone, says: 'See the lamps.' },
  'fixture.create': { roles: planners, says: 'Add a lamp.' },
  'fixture.update': { roles: planners, says: 'Change a lamp.' },
  'fixture.delete': { roles: planners, says: 'Delete a lamp that hangs nowhere.' },
  'target.read': { roles: everyone, says: "See the garden's own targets." },
  'target.create': { roles: planners, says: 'Set an own target or add a crop.' },
  'target.update': { roles: planners, says: 'Change an own target.' },
  'target.delete': { roles: planners, says: 'Go back to the reference target.' },
  'scenario.read': { roles: everyone, says: 'See the scenarios and what the physics says of them.' },
  'scenario.create': { roles: planners, says: 'Add or copy a scenario.' },
  'scenario.update': { roles: planners, says: 'Change a scenario.' },
  'scenario.delete': { roles: planners, says: 'Delete a scenario.' },
} as const satisfies Record<string, { roles: readonly Role[]; says: string }>;

export type Action = keyof typeof permissions;

export const roleSentences: Record<Role, string> = {
  owner: 'Everything, people included.',
  planner: 'Makes and changes rooms, tents, lamps, targets and scenarios.',
  tender: 'Reads all; will tick off tasks and add readings; changes no plan.',
  viewer: 'Reads all.',
};

export function can(role: Role, action: Action): boolean {
  const rule: { roles: readonly Role[] } | undefined = permissions[action];
  return rule !== undefined && rule.roles.includes(role);
}

/** Every action and whether the role may; what a page needs to show or hide its verbs. */
export function allowedActions(role: Role): Record<Action, boolean> {
  return Object.fromEntries(Object.keys(permissions).map((action) => [action, can(role, action as Action)])) as Record<
    Action,
    boolean
  >;
}
