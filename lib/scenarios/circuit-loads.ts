import type { Plan } from './plan.schema';

/** What may hang on a circuit, by kind. */
export const LOAD_KINDS: readonly string[] = ['light', 'heater', 'exhaust', 'circulation', 'pump'];

/**
 * What each circuit of a room carries, in the room's order.
 *
 * Where the plan does not say, the first circuit carries all. What hung on a circuit that the room no longer has hangs on the
 * first until somebody says where: a load that hangs nowhere would make a full circuit look free.
 */
export function carriedBy(
  { circuitLoads }: Pick<Plan, 'circuitLoads'>,
  circuits: readonly { id: string }[],
): { id: string; carries: string[] }[] {
  if (!circuitLoads) return circuits.map(({ id }, index) => ({ id, carries: index === 0 ? [...LOAD_KINDS] : [] }));
  const said = new Map(Object.entries(circuitLoads));
  const held = new Set(circuits.flatMap(({ id }) => said.get(id) ?? []));
  const stray = [...new Set([...said.values()].flat())].filter((load) => !held.has(load));
  return circuits.map(({ id }, index) => ({ id, carries: [...(said.get(id) ?? []), ...(index === 0 ? stray : [])] }));
}
