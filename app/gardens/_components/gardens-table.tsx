import { TableBehind } from '@/app/_components/table-behind';

interface GardensTableProps {
  rows: { garden: string; tent: string; says: string; scenario: string; yearKwh: string }[];
}

export function GardensTable({ rows }: GardensTableProps) {
  if (rows.length === 0) return null;
  return (
    <div className="pb-6">
      <TableBehind
        opener="Everything here as a table"
        caption="Tents of all your gardens"
        order="as drawn"
        columns={[
          { key: 'tent', label: 'Tent' },
          { key: 'garden', label: 'Garden' },
          { key: 'scenario', label: 'Scenario in use' },
          { key: 'says', label: 'What it says' },
          { key: 'yearKwh', label: 'A year', unit: 'kWh', align: 'right' },
        ]}
        rows={rows}
      />
    </div>
  );
}
