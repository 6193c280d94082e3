import { useFormikContext } from 'formik';
import { View } from 'react-native';
import { formatQuantity } from '../../../../shared/units/format';
import { FieldReader } from '../../../api/kept-forms/typed-quantity';
import { useUnitSystem } from '../../../session';
import { Figure, Small, SPACE } from '../../../ui';
import { pouchFrom, type PackFormValues } from '../pack-form-values';
import { pouchMeasures } from '../pouch-measures';
import { PouchDrawing } from './pouch-drawing';

/** The pouch drawn from what is typed, with its area and its seals, while it is typed. */
export function PackMeasures({ before }: { before: Parameters<typeof pouchFrom>[2] }) {
  const { values } = useFormikContext<PackFormValues>();
  const unitSystem = useUnitSystem();
  const pouch = pouchFrom(values, new FieldReader(unitSystem), before);
  const measures = pouchMeasures(pouch);
  if (measures === null) return <Small>The outline comes as soon as the dimensions make a pouch.</Small>;
  const area = formatQuantity(measures.area_m2, 'area_m2', { unitSystem });
  const seal = formatQuantity(measures.seal_length_m * 1000, 'length_mm', { unitSystem });
  return (
    <View style={{ gap: SPACE.x3 }}>
      <PouchDrawing pouch={pouch} />
      <View style={{ flexDirection: 'row', flexWrap: 'wrap', columnGap: SPACE.x6, rowGap: SPACE.x2 }}>
        <View>
          <Small>Area that lets gas through</Small>
          <Figure value={area.figures} unit={area.unit} size="title" isStrong />
        </View>
        <View>
          <Small>Length of the seals</Small>
          <Figure value={seal.figures} unit={seal.unit} size="title" isStrong />
        </View>
      </View>
      <Small>Both sides between the seals, and the gusset unfolded; seals by their inner edge.</Small>
    </View>
  );
}
