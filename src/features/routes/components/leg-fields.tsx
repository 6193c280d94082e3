import { View } from 'react-native';
import { fieldUnit } from '../../../api/kept-forms/typed-quantity';
import { useUnitSystem } from '../../../session';
import { FormField, FormNumberField, HAIRLINE_PX, IconButton, SPACE, useTheme } from '../../../ui';
import { FieldGrid } from '../../../ui/field-grid';
import type { LegEvent } from '../route-legs';

export interface LegFieldsProps {
  legKey: string;
  index: number;
  count: number;
  onEvent: (event: LegEvent) => void;
}

/** One leg: where, how warm, how moist, how long. */
export function LegFields({ legKey, index, count, onEvent }: LegFieldsProps) {
  const { colors } = useTheme();
  const unitSystem = useUnitSystem();
  const path = `route.legs[${index}]`;
  const words = `leg ${index + 1} of ${count}`;
  return (
    <View
      role="listitem"
      aria-label={`Leg ${index + 1}`}
      style={{
        gap: SPACE.x2,
        paddingBottom: SPACE.x3,
        borderBottomWidth: HAIRLINE_PX,
        borderBottomColor: colors.lineFaint,
      }}
    >
      <View style={{ flexDirection: 'row', alignItems: 'flex-end', gap: SPACE.x1 }}>
        <View style={{ flexGrow: 1, flexShrink: 1, minWidth: 0 }}>
          <FormField name={`${path}.name`} label={`Leg ${index + 1}`} options={{ isOptional: true }} />
        </View>
        <IconButton
          icon="up"
          label={`Move ${words} earlier`}
          isDisabled={index === 0}
          onPress={() => onEvent({ type: 'leg_moved', key: legKey, by: -1 })}
        />
        <IconButton
          icon="down"
          label={`Move ${words} later`}
          isDisabled={index === count - 1}
          onPress={() => onEvent({ type: 'leg_moved', key: legKey, by: 1 })}
        />
        <IconButton
          icon="remove"
          label={`Remove ${words}`}
          isDisabled={count === 1}
          onPress={() => onEvent({ type: 'leg_removed', key: legKey })}
        />
      </View>
      <FieldGrid leastWidthPx={96}>
        <FormNumberField
          name={`${path}.temperature_C`}
          label="Temperature"
          unit={fieldUnit('temperature_C', unitSystem)}
        />
        <FormNumberField name={`${path}.relative_humidity`} label="Humidity" unit="%" />
        <FormNumberField name={`${path}.days`} label="Days" unit="d" />
      </FieldGrid>
    </View>
  );
}
