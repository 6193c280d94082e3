import type { Candidate } from '../../../../shared/contract/studies';
import { DataTable, Disclosure, Sheet, Stack } from '../../../ui';
import { inputRows, layerInputRows } from '../study-inputs';
import { useFigures } from '../use-figures';

/** Everything that went in, as the result keeps it. */
export function InputsSheet({ candidate, wallIndex }: { candidate: Candidate; wallIndex: number }) {
  const show = useFigures();
  const layers = candidate.description.pack.walls[wallIndex]?.layers ?? [];
  return (
    <Sheet title="Working" subtitle="The inputs as they were when this was computed.">
      <Disclosure label="All inputs">
        <Stack gap="x4">
          <DataTable
            caption="Food, limits, pack and route"
            columns={[
              { key: 'what', title: 'Input' },
              { key: 'value', title: 'Value' },
            ]}
            rows={inputRows(candidate, show).map((row) => ({ ...row }))}
          />
          <DataTable
            caption="Layers, outside first"
            columns={[
              { key: 'layer', title: 'Layer' },
              { key: 'gauge', title: 'Gauge', kind: 'figure' },
              { key: 'oxygen', title: 'Oxygen' },
              { key: 'water', title: 'Water' },
            ]}
            rows={layerInputRows(layers, show).map((row) => ({ ...row }))}
          />
        </Stack>
      </Disclosure>
    </Sheet>
  );
}
