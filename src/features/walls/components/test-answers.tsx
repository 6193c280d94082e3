import { View } from 'react-native';
import { testName } from '../../../../shared/charts/test-name';
import { formatQuantity, type DisplayUnitSystem, type ShownQuantity } from '../../../../shared/units/format';
import type { WallInTest } from '../../../../shared/engine';
import { useUnitSystem } from '../../../session';
import { DataTable, Disclosure, Figure, HAIRLINE_PX, Small, SPACE, useTheme } from '../../../ui';
import type { WallPreview } from '../wall-preview';

/** The permeances under the chosen conditions, large; the standard tests under them. */
export function TestAnswers({ preview }: { preview: WallPreview }) {
  const unitSystem = useUnitSystem();
  return (
    <View style={{ gap: SPACE.x2 }}>
      <PermeanceAnswers preview={preview} label="Under these conditions" />
      <Disclosure label="At the standard tests" isOpenAtFirst>
        <StandardTests tests={preview.tests} unitSystem={unitSystem} />
      </Disclosure>
    </View>
  );
}

/** Both permeances under the chosen conditions. */
export function PermeanceAnswers({ preview, label }: { preview: WallPreview; label: string }) {
  const unitSystem = useUnitSystem();
  const { oxygen, water } = preview.chosen;
  return (
    <View
      role="group"
      aria-label={label}
      style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: SPACE.x6, rowGap: SPACE.x2 }}
    >
      <Answer
        label="Oxygen permeance"
        shown={formatQuantity(oxygen.permeance_mol_per_m2_s_Pa, 'oxygen_permeance_mol_per_m2_s_Pa', {
          unitSystem,
        })}
        gas="oxygen"
      />
      <Answer
        label="Water vapour permeance"
        shown={formatQuantity(water.permeance_mol_per_m2_s_Pa, 'water_permeance_mol_per_m2_s_Pa', {
          unitSystem,
        })}
        gas="water"
      />
    </View>
  );
}

function Answer({ label, shown, gas }: { label: string; shown: ShownQuantity; gas: 'oxygen' | 'water' }) {
  const { colors } = useTheme();
  return (
    <View
      style={{
        borderLeftWidth: HAIRLINE_PX * 3,
        borderLeftColor: colors[gas],
        paddingLeft: SPACE.x2,
        gap: 2,
      }}
    >
      <Small>{label}</Small>
      <Figure value={shown.figures} unit={shown.unit} size="title" isStrong />
    </View>
  );
}

function StandardTests({ tests, unitSystem }: { tests: WallInTest[]; unitSystem: DisplayUnitSystem }) {
  return (
    <DataTable
      caption="Rates at the standard tests"
      isCaptionHidden
      columns={[
        { key: 'test', title: 'Test' },
        { key: 'rate', title: 'Rate', kind: 'figure' },
      ]}
      rows={tests.map((test, index) => ({
        id: String(index),
        test: testName(
          test.test,
          (value, kind) => formatQuantity(value, kind, { unitSystem, isExact: true }).text,
        ),
        rate: shownRate(test, unitSystem),
      }))}
    />
  );
}

/** A rate below what laboratories can measure says so, with its figure behind. */
function shownRate(test: WallInTest, unitSystem: DisplayUnitSystem): string {
  const rate =
    test.test.gas === 'oxygen'
      ? formatQuantity(test.rate_cm3_STP_per_m2_day ?? NaN, 'oxygen_rate_cm3_STP_per_m2_day', { unitSystem })
      : formatQuantity(test.rate_g_per_m2_day ?? NaN, 'water_rate_g_per_m2_day', { unitSystem });
  return test.is_below_measurable ? `below what labs can measure (${rate.text})` : rate.text;
}
