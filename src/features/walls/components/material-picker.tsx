import { useMemo, useState } from 'react';
import { View } from 'react-native';
import { HatchSwatch } from '../../../charts/mini-section';
import { MATERIAL_CLASSES } from '../../../../shared/contract/materials';
import { formatQuantity } from '../../../../shared/units/format';
import type { KeptMaterial } from '../../../api/kept-things-queries';
import { useUnitSystem } from '../../../session';
import { Body, Button, Dialog, Heading, Inline, Link, Small, SPACE, Stack, TextField } from '../../../ui';
import { matchingMaterials } from '../matching-materials';
import { gaugeFromUm, type ChosenMaterial, type DraftGauge } from '../wall-draft';
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

/** Materials by class; one press takes one at a usual gauge. */
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

const GAUGE_WHERE_NONE_IS_USUAL_UM = 20;

function PickedMaterial({ material, onChosen }: PickedMaterialProps) {
  const unitSystem = useUnitSystem();
  const { spec } = material.revision;
  const gauges =
    spec.typical_gauges_um.length === 0 ? [GAUGE_WHERE_NONE_IS_USUAL_UM] : spec.typical_gauges_um;
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
        {gauges.map((gaugeUm) => (
          <Button
            key={gaugeUm}
            label={
              formatQuantity(gaugeUm, 'thickness_um', { unitSystem, isExact: unitSystem === 'metric' }).text
            }
            onPress={() =>
              onChosen(
                { material_id: material.id, material_revision_id: material.revision.id },
                gaugeFromUm(gaugeUm, unitSystem),
              )
            }
          />
        ))}
      </Inline>
    </View>
  );
}

function capitalised(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
