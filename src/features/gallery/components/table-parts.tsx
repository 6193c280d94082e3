import { DataTable, Sheet } from '../../../ui';
import type { DataColumn, DataRow } from '../../../ui';
import { BothSchemes } from './both-schemes';

const FEW: DataColumn[] = [
  { key: 'layer', title: 'Layer' },
  { key: 'oxygen', title: 'Oxygen', unit: '%', kind: 'figure' },
  { key: 'water', title: 'Water', unit: '%', kind: 'figure' },
];

const MANY: DataColumn[] = [
  ...FEW,
  { key: 'gauge', title: 'Gauge', unit: 'µm', kind: 'figure' },
  { key: 'source', title: 'Source' },
];

const ROWS: DataRow[] = [
  { id: '1', layer: 'PET', oxygen: '1.4', water: '15.7', gauge: '12', source: 'published' },
  { id: '2', layer: 'EVOH', oxygen: '98.5', water: '1.0', gauge: '5', source: 'from memory' },
  { id: '3', layer: 'LDPE', oxygen: '<0.1', water: '78.6', gauge: '60', source: 'published' },
];

export function TableParts() {
  return (
    <BothSchemes title="Tables">
      {(scheme) => (
        <Sheet>
          <DataTable caption={`Few columns, ${scheme}`} columns={FEW} rows={ROWS} />
          <DataTable caption={`Many columns, ${scheme}`} columns={MANY} rows={ROWS} />
          <DataTable
            caption={`No rows, ${scheme}`}
            columns={FEW}
            rows={[]}
            emptyText="No layer has a share so far."
          />
        </Sheet>
      )}
    </BothSchemes>
  );
}
