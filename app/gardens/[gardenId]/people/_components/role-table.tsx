import { TableBehind } from '@/app/_components/table-behind';
import { permissions } from '@/lib/auth/permissions';

const ROLES = ['owner', 'planner', 'tender', 'viewer'] as const;

/** What each role may do, word for word as the server decides it. */
export function RoleTable() {
  const rows = Object.values(permissions).map((rule) => {
    const may: readonly string[] = rule.roles;
    return {
      says: rule.says.replace(/\.$/, ''),
      ...Object.fromEntries(ROLES.map((role) => [role, may.includes(role) ? 'may' : 'no'])),
    };
  });
  return (
    <div className="mt-9 border-t border-line pt-5">
      <TableBehind
        opener="What each role may do"
        caption="What each role may do"
        columns={[
          { key: 'says', label: 'To do' },
          ...ROLES.map((role) => ({ key: role, label: role[0]!.toUpperCase() + role.slice(1) })),
        ]}
        rows={rows}
      />
    </div>
  );
}
