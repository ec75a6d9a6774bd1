/** Columns of an update: what was given, JSON as text; what was left out stays as it is. */
export function changedColumns(values: Record<string, unknown>): Record<string, unknown> {
  return Object.fromEntries(
    Object.entries(values).flatMap(([column, value]) => {
      if (value === undefined) return [];
      return [[column, typeof value === 'object' && value !== null ? JSON.stringify(value) : value]];
    }),
  );
}
