import { useMemo, useState } from 'react';
import { View } from 'react-native';
import { ENGINE_VERSION } from '../../../../shared/engine';
import type { LayerDescription } from '../../../../shared/engine/description/storage-description';
import { HAIRLINE_PX, NumberField, SPACE, Sheet, Small, useTheme } from '../../../ui';
import { fieldText } from '../../../api/kept-forms/typed-quantity';
import { useFigures } from '../use-figures';
import { Measurable, isBelowMeasurable } from './measurable';
import { readCondition, wallAtCondition, type ConditionText } from '../wall-condition';

/** Where data sheets most often state a wall. */
const START = { temperatureC: 23, humidityOutside: '50', humidityInside: '50' };

/** The wall at a condition that one types in: permeance, OTR, WVTR while typing. */
export function OwnConditionSheet({ layers }: { layers: LayerDescription[] }) {
  const show = useFigures();
  const [text, setText] = useState<ConditionText>({
    temperature: fieldText(START.temperatureC, 'temperature_C', show.unitSystem),
    humidityOutside: START.humidityOutside,
    humidityInside: START.humidityInside,
  });
  const read = useMemo(() => readCondition(text, show.unitSystem), [text, show.unitSystem]);
  const faults = 'faults' in read ? read.faults : {};
  const wall = useMemo(
    () => ('condition' in read ? wallAtCondition(layers, read.condition) : null),
    [layers, read],
  );
  const set = (key: keyof ConditionText) => (value: string) =>
    setText((before) => ({ ...before, [key]: value }));
  return (
    <Sheet
      title="At a condition of your own"
      subtitle={`A preview by engine ${ENGINE_VERSION} in this browser; it is not kept.`}
    >
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', gap: SPACE.x3 }}>
        <ConditionField
          label="Temperature"
          unit={show.unit('temperature_C')}
          value={text.temperature}
          error={faults.temperature}
          onChange={set('temperature')}
        />
        <ConditionField
          label="Humidity outside"
          unit="%"
          value={text.humidityOutside}
          error={faults.humidityOutside}
          onChange={set('humidityOutside')}
        />
        <ConditionField
          label="Humidity inside"
          unit="%"
          value={text.humidityInside}
          error={faults.humidityInside}
          onChange={set('humidityInside')}
        />
      </View>
      <View role="status" aria-live="polite">
        {wall === null ? (
          <Small>Mend the marked field to see the wall there.</Small>
        ) : (
          <>
            <ResultLine
              label="Oxygen permeance"
              note="of the whole wall"
              figures={show.figures(wall.oxygenPermeanceSi, 'oxygen_permeance_mol_per_m2_s_Pa')}
              unit={show.unit('oxygen_permeance_mol_per_m2_s_Pa')}
            />
            <ResultLine
              label="OTR"
              note="in pure oxygen against none"
              figures={show.figures(wall.otrCm3PerM2Day, 'oxygen_rate_cm3_STP_per_m2_day')}
              unit={show.unit('oxygen_rate_cm3_STP_per_m2_day')}
              isBelow={isBelowMeasurable(wall.otrCm3PerM2Day)}
            />
            <ResultLine
              label="WVTR"
              note="between the two humidities"
              words={
                'condition' in read && read.condition.humidityOutside === read.condition.humidityInside
                  ? 'no humidity difference, nothing flows'
                  : undefined
              }
              figures={show.figures(wall.wvtrGPerM2Day, 'water_rate_g_per_m2_day')}
              unit={show.unit('water_rate_g_per_m2_day')}
              isBelow={isBelowMeasurable(wall.wvtrGPerM2Day)}
            />
            <ResultLine
              label="Water vapour permeance"
              note="of the whole wall"
              figures={show.figures(wall.waterPermeanceSi, 'water_permeance_mol_per_m2_s_Pa')}
              unit={show.unit('water_permeance_mol_per_m2_s_Pa')}
            />
          </>
        )}
      </View>
    </Sheet>
  );
}

interface ConditionFieldProps {
  label: string;
  unit: string;
  value: string;
  error: string | undefined;
  onChange: (text: string) => void;
}

function ConditionField(props: ConditionFieldProps) {
  return (
    <View style={{ flexGrow: 1, flexBasis: 130, minWidth: 0 }}>
      <NumberField {...props} />
    </View>
  );
}

interface ResultLineProps {
  label: string;
  note: string;
  figures: string;
  unit: string;
  isBelow?: boolean;
  /** In place of a figure. */
  words?: string;
}

function ResultLine({ label, note, figures, unit, isBelow = false, words }: ResultLineProps) {
  const { colors } = useTheme();
  return (
    <View
      style={{
        flexDirection: 'row',
        justifyContent: 'space-between',
        alignItems: 'baseline',
        flexWrap: 'wrap',
        columnGap: SPACE.x3,
        paddingVertical: SPACE.x2,
        borderTopWidth: HAIRLINE_PX,
        borderTopColor: colors.lineFaint,
      }}
    >
      <View style={{ flexShrink: 1 }}>
        <Small tone="ink" weight="medium">
          {label}
        </Small>
        <Small tone="third">{note}</Small>
      </View>
      {words === undefined ? (
        <Measurable figures={figures} unit={unit} isBelowMeasurable={isBelow} size="body" />
      ) : (
        <Small tone="ink" align="right">
          {words}
        </Small>
      )}
    </View>
  );
}
