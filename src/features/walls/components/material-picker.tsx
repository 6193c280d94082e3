import { useMemo, useState } from 'react';
import { View } from 'react-native';
import { HatchSwatch } from '../../../charts/mini-section';
import { MATERIAL_CLASSES } from '../../../../shared/contract/materials';
import { RULES } from '../../../../shared/contract/rules';
import { formatQuantity, type DisplayUnitSystem } from '../../../../shared/units/format';
import { fieldUnit } from '../../../api/kept-forms/typed-quantity';
import type { KeptMaterial } from '../../../api/kept-things-queries';
import { useUnitSystem } from '../../../session';
import {
  Body,
  Button,
  Dialog,
  Heading,
  Inline,
  Link,
  NumberField,
  Small,
  SPACE,
  Stack,
  TextField,
} from '../../../ui';
import { matchingMaterials } from '../matching-materials';
import { gaugeFromUm, gaugeUm, typedGauge, type ChosenMaterial, type DraftGauge } from '../wall-draft';
import { weakGroundInWords } from '../weak-ground';

export interface MaterialPickerProps {
  title: string;
  materials: KeptMaterial[];
  /** Where a material that is missing here is made; the wall waits as a draft. */
  newMaterialHref: string;
  isOpen: boolean;
  searchAtFirst?: string;
  onChosen: (material: ChosenMaterial, gauge: DraftGauge) => void;
  onClose: () => void;
}

/** Materials by class; one press takes one at a usual gauge, or at a typed one where none is usual. */
export function MaterialPicker(props: MaterialPickerProps) {
  const { title, materials, isOpen, onClose, searchAtFirst = '' } = props;
  const [search, setSearch] = useState(searchAtFirst);
  const groups = useMemo(() => {
    const found = matchingMaterials(materials, search);
    return MATERIAL_CLASSES.map((materialClass) => ({
      materialClass,
      materials: found.filter((material) => material.revision.spec.material_class === materialClass),
    })).filter((group) => group.materials.length > 0);
  }, [materials, search]);

  return (
    <Dialog title={title} isOpen={isOpen} onClose={onClose}>
      <Stack gap="x4">
        <TextField
          label="Search by name, class or polymer"
          value={search}
          onChange={setSearch}
          options={{ type: 'search', isOptional: true }}
        />
        {groups.length === 0 ? (
          <Small>{`No material matches “${search.trim()}”. Search for something shorter, or describe a new one.`}</Small>
        ) : null}
        {groups.map((group) => (
          <Stack key={group.materialClass} gap="x1">
            <Heading level={3}>{capitalised(group.materialClass)}</Heading>
            {group.materials.map((material) => (
              <PickedMaterial key={material.id} material={material} onChosen={props.onChosen} />
            ))}
          </Stack>
        ))}
        <Link href={props.newMaterialHref} isStandalone>
          Describe a new material
        </Link>
      </Stack>
    </Dialog>
  );
}

interface PickedMaterialProps {
  material: KeptMaterial;
  onChosen: (material: ChosenMaterial, gauge: DraftGauge) => void;
}

function PickedMaterial({ material, onChosen }: PickedMaterialProps) {
  const unitSystem = useUnitSystem();
  const { spec } = material.revision;
  const chosen = { material_id: material.id, material_revision_id: material.revision.id };
  const weak = weakGroundInWords(spec);
  return (
    <View role="group" aria-label={spec.name} style={{ gap: SPACE.x1, paddingVertical: SPACE.x2 }}>
      <View style={{ flexDirection: 'row', alignItems: 'center', gap: SPACE.x2 }}>
        <HatchSwatch
          layer={{
            name: spec.name,
            materialClass: spec.material_class,
            polymerFamily: spec.polymer_family,
            kind: spec.kind,
          }}
        />
        <View style={{ flexShrink: 1 }}>
          <Body weight="medium">{spec.name}</Body>
        </View>
      </View>
      {weak === '' ? null : <Small tone="third">{weak}</Small>}
      <Inline gap="x1">
        {spec.typical_gauges_um.map((gaugeUm) => (
          <Button
            key={gaugeUm}
            label={
              formatQuantity(gaugeUm, 'thickness_um', { unitSystem, isExact: unitSystem === 'metric' }).text
            }
            onPress={() => onChosen(chosen, gaugeFromUm(gaugeUm, unitSystem))}
          />
        ))}
      </Inline>
      {spec.typical_gauges_um.length === 0 ? (
        <FreeGauge onTyped={(gauge) => onChosen(chosen, gauge)} />
      ) : null}
    </View>
  );
}

/** For a material that says no usual gauge: nobody's guess stands in the box. */
function FreeGauge({ onTyped }: { onTyped: (gauge: DraftGauge) => void }) {
  const unitSystem = useUnitSystem();
  const [text, setText] = useState('');
  const [error, setError] = useState('');
  const take = () => {
    const gauge = typedGauge(text, unitSystem);
    const thicknessUm = gaugeUm(gauge);
    if (thicknessUm > 0 && thicknessUm <= RULES.gauge.max) onTyped(gauge);
    else setError(`Gauge: enter a number above 0, at most ${mostGauge(unitSystem)}.`);
  };
  return (
    <div
      style={{ display: 'flex', alignItems: 'flex-end', flexWrap: 'wrap', gap: SPACE.x2 }}
      onKeyDown={(event) => {
        // The picker stands within the wall's form, which Enter would send.
        if (event.key !== 'Enter' || !(event.target instanceof HTMLInputElement)) return;
        event.preventDefault();
        take();
      }}
    >
      <NumberField
        label="Gauge"
        value={text}
        unit={fieldUnit('thickness_um', unitSystem)}
        error={error}
        options={{ widthInCharacters: 8 }}
        onChange={(typed) => {
          setText(typed);
          setError('');
        }}
      />
      <Button label="Use this gauge" onPress={take} />
    </div>
  );
}

function mostGauge(unitSystem: DisplayUnitSystem): string {
  return formatQuantity(RULES.gauge.max, 'thickness_um', { unitSystem }).text;
}

function capitalised(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
