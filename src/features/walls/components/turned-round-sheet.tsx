import { useMemo, useState } from 'react';
import { View } from 'react-native';
import { fieldUnit } from '../../../api/kept-forms/typed-quantity';
import { useUnitSystem } from '../../../session';
import { Body, NumberField, Sheet, Small, SPACE } from '../../../ui';
import type { BuiltLayer } from '../built-layer';
import { sidesAsText, sidesFault, sidesField, sidesFromText } from '../sides-text';
import { turnedRoundOf } from '../turned-round';
import { turnedRoundInWords } from '../turned-round-words';

export interface TurnedRoundProps {
  layers: BuiltLayer[];
  temperature_C: number;
}

const HUMIDITIES = ['relative_humidity_outside', 'relative_humidity_inside'] as const;

/** What turning the wall round would do, between two sides that differ: a moist shop and a dry food at first. */
export function TurnedRound({ layers, temperature_C }: TurnedRoundProps) {
  const unitSystem = useUnitSystem();
  const [humidities, setHumidities] = useState({
    relative_humidity_outside: '75',
    relative_humidity_inside: '30',
  });
  const sides = sidesFromText(
    {
      ...sidesAsText(
        { temperature_C, relative_humidity_outside: 0, relative_humidity_inside: 0 },
        unitSystem,
      ),
      ...humidities,
    },
    unitSystem,
  );
  const outside = sides?.relative_humidity_outside;
  const inside = sides?.relative_humidity_inside;
  const words = useMemo(() => {
    if (outside === undefined || inside === undefined) return null;
    const descriptions = layers.map((layer) => layer.description);
    const between = { temperature_C, relative_humidity_outside: outside, relative_humidity_inside: inside };
    return turnedRoundInWords(turnedRoundOf(descriptions, between), unitSystem);
  }, [layers, temperature_C, outside, inside, unitSystem]);

  return (
    <Sheet title="Turned round" subtitle="Which way it faces matters where a layer feels humidity.">
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: SPACE.x3, rowGap: SPACE.x2 }}>
        {HUMIDITIES.map((name) => {
          const { label, kind } = sidesField(name);
          return (
            <View key={name} style={{ flexGrow: 1, flexShrink: 1, flexBasis: 120, minWidth: 96 }}>
              <NumberField
                label={label}
                value={humidities[name]}
                unit={fieldUnit(kind, unitSystem)}
                error={sidesFault(name, humidities[name], unitSystem)}
                onChange={(text) => setHumidities({ ...humidities, [name]: text })}
              />
            </View>
          );
        })}
      </View>
      <View role="status" aria-live="polite">
        {words === null ? (
          <Small>The comparison comes as soon as both humidities fit.</Small>
        ) : (
          <Body>{words}</Body>
        )}
      </View>
    </Sheet>
  );
}
