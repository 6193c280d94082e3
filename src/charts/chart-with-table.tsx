import type { ReactNode } from 'react';
import { DataTable, Disclosure, Stack } from '../ui';
import type { DataColumn, DataRow } from '../ui';

export interface ChartWithTableProps {
  children: ReactNode;
  table: { caption: string; columns: DataColumn[]; rows: DataRow[] };
  /** What the table is called on the button that opens it. */
  label?: string;
}

/** A chart and the figures behind it. */
export function ChartWithTable({ children, table, label }: ChartWithTableProps) {
  return (
    <Stack gap="x1">
      {children}
      <Disclosure label={label}>
        <DataTable {...table} />
      </Disclosure>
    </Stack>
  );
}
