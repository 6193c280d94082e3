import { View } from 'react-native';
import { fieldUnit } from '../../../api/kept-forms/typed-quantity';
import { useUnitSystem } from '../../../session';
import { NumberField, SPACE } from '../../../ui';
import { SIDES_FIELDS, sidesFault, sidesField, type SidesText } from '../sides-text';

export interface SidesFieldsProps {
  text: SidesText;
  onChange: (text: SidesText) => void;
}

/** Temperature and the humidity of both sides. */
export function SidesFields({ text, onChange }: SidesFieldsProps) {
  const unitSystem = useUnitSystem();
  return (
    <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: SPACE.x3, rowGap: SPACE.x2 }}>
      {SIDES_FIELDS.map((name) => {
        const { label, kind } = sidesField(name);
        return (
          <View key={name} style={{ flexGrow: 1, flexShrink: 1, flexBasis: 96, minWidth: 96 }}>
            <NumberField
              label={label}
              value={text[name]}
              unit={fieldUnit(kind, unitSystem)}
              error={sidesFault(name, text[name], unitSystem)}
              onChange={(next) => onChange({ ...text, [name]: next })}
            />
          </View>
        );
      })}
    </View>
  );
}
