import type { WallAnswer, WallInTest } from '../../../../shared/engine/description/evaluation';
import { testName } from '../../../../shared/charts/test-name';
import { DataTable, Sheet } from '../../../ui';
import { useFigures, type Figures } from '../use-figures';
import { Measurable, isBelowMeasurable } from './measurable';
import { legTitle } from './wall-sheet';

/** OTR and WVTR of the whole wall: on the route's legs, and where data sheets state them. */
export function TransmissionSheet({ wall }: { wall: WallAnswer }) {
  const show = useFigures();
  return (
    <Sheet
      title="Through the whole wall"
      subtitle="Rates belong to their conditions; a permeance is a rate over its pressure difference."
    >
      <DataTable
        caption="On the route, as each leg begins"
        columns={[
          { key: 'leg', title: 'Leg' },
          {
            key: 'oxygen',
            title: 'Oxygen',
            unit: show.unit('oxygen_rate_cm3_STP_per_m2_day'),
            kind: 'figure',
          },
          { key: 'water', title: 'Water', unit: show.unit('water_rate_g_per_m2_day'), kind: 'figure' },
          {
            key: 'permeance',
            title: 'Oxygen permeance',
            unit: show.unit('oxygen_permeance_mol_per_m2_s_Pa'),
            kind: 'figure',
          },
          {
            key: 'waterPermeance',
            title: 'Water vapour permeance',
            unit: show.unit('water_permeance_mol_per_m2_s_Pa'),
            kind: 'figure',
          },
        ]}
        rows={wall.legs.map((leg) => ({
          id: String(leg.leg),
          leg: `${legTitle(leg)}, ${show.exact(leg.temperature_C, 'temperature_C')}, ${show.exact(leg.relative_humidity_outside, 'fraction_as_percent')}`,
          oxygen: (
            <Measurable
              figures={show.figures(leg.oxygen.flux_cm3_STP_per_m2_day, 'oxygen_rate_cm3_STP_per_m2_day')}
              isBelowMeasurable={isBelowMeasurable(leg.oxygen.flux_cm3_STP_per_m2_day)}
            />
          ),
          water: (
            <Measurable
              figures={show.figures(leg.water.flux_g_per_m2_day, 'water_rate_g_per_m2_day')}
              isBelowMeasurable={isBelowMeasurable(leg.water.flux_g_per_m2_day)}
            />
          ),
          permeance: show.figures(leg.oxygen.permeance_mol_per_m2_s_Pa, 'oxygen_permeance_mol_per_m2_s_Pa'),
          waterPermeance: show.figures(
            leg.water.permeance_mol_per_m2_s_Pa,
            'water_permeance_mol_per_m2_s_Pa',
          ),
        }))}
      />
      <DataTable
        caption="At standard test conditions"
        columns={[
          { key: 'test', title: 'Test' },
          { key: 'rate', title: 'Rate', kind: 'figure' },
        ]}
        rows={wall.tests.map((one, index) => ({
          id: String(index),
          test: testName(one.test, show.exact),
          rate: <TestRate test={one} show={show} />,
        }))}
      />
    </Sheet>
  );
}

function TestRate({ test, show }: { test: WallInTest; show: Figures }) {
  const kind = test.test.gas === 'oxygen' ? 'oxygen_rate_cm3_STP_per_m2_day' : 'water_rate_g_per_m2_day';
  const rate = test.rate_cm3_STP_per_m2_day ?? test.rate_g_per_m2_day ?? 0;
  return (
    <Measurable
      figures={show.figures(rate, kind)}
      unit={show.unit(kind)}
      isBelowMeasurable={test.is_below_measurable}
    />
  );
}
