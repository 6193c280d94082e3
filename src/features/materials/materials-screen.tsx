import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { View } from 'react-native';
import { HatchSwatch } from '../../charts/mini-section';
import { MATERIAL_CLASSES, type MaterialSpec } from '../../../shared/contract/materials';
import type { DisplayUnitSystem } from '../../../shared/units/format';
import { describeError } from '../../api/describe-error';
import { provenanceInWords, weakGroundOf } from '../../api/kept-forms/provenance-words';
import { keptThingsQueries, type KeptMaterial } from '../../api/kept-things-queries';
import { hasRole, useAccount, useUnitSystem } from '../../session';
import { Inline, LinkButton, Row, Screen, Select, Small, Stack } from '../../ui';
import { FetchedList } from '../../ui/fetched-list';
import { conditionsInShort } from './conditions-in-words';
import { coefficientInWords } from './si-words';

/** All materials of the account, searched and filtered by class. */
export function MaterialsScreen() {
  const account = useAccount();
  const materials = useQuery(keptThingsQueries(account.id, 'materials').all());
  const [materialClass, setMaterialClass] = useState('');
  const newMaterial = hasRole(account, ['engineer']) ? (
    <LinkButton href={`${account.basePath}/materials/new`} label="New material" icon="add" kind="primary" />
  ) : undefined;
  return (
    <Screen
      title="Materials"
      subtitle="Every number is typical until you put your supplier’s own in its place."
      action={newMaterial}
    >
      <FetchedList
        what="materials"
        fetched={materials}
        failure={describeError(materials.error, 'The materials could not be fetched')}
        empty={{
          title: 'No material yet',
          text: 'A material is a film, a coating or a foil with what it lets through of oxygen and water vapour.',
          action: newMaterial,
        }}
        textOf={({ revision: { spec } }) => `${spec.name} ${spec.material_class} ${spec.polymer_family}`}
      >
        {(found) => (
          <Stack gap="x3">
            <Select
              label="Class"
              value={materialClass}
              onChange={setMaterialClass}
              options={[
                { value: '', label: 'All classes' },
                ...MATERIAL_CLASSES.map((each) => ({ value: each, label: each })),
              ]}
            />
            <MaterialRows
              materials={found.filter(
                (material) => materialClass === '' || material.revision.spec.material_class === materialClass,
              )}
            />
          </Stack>
        )}
      </FetchedList>
    </Screen>
  );
}

function MaterialRows({ materials }: { materials: KeptMaterial[] }) {
  const account = useAccount();
  const unitSystem = useUnitSystem();
  const sorted = [...materials].sort((a, b) =>
    a.revision.spec.name.localeCompare(b.revision.spec.name, 'en'),
  );
  if (sorted.length === 0) return <Small>No material of that class matches.</Small>;
  return (
    <Stack gap="x1" role="list" label="Materials">
      {sorted.map((material, index) => {
        const { spec } = material.revision;
        return (
          <View key={material.id} role="listitem">
            <Row
              href={`${account.basePath}/materials/${material.id}`}
              label={spec.name}
              isLast={index === sorted.length - 1}
              detail={
                <View>
                  <Inline gap="x2">
                    <HatchSwatch
                      layer={{
                        name: spec.name,
                        materialClass: spec.material_class,
                        polymerFamily: spec.polymer_family,
                        kind: spec.kind,
                      }}
                    />
                    <Small>{`${spec.material_class}, ${spec.kind}`}</Small>
                  </Inline>
                  <Coefficients spec={spec} unitSystem={unitSystem} />
                  <WeakGround spec={spec} />
                </View>
              }
            />
          </View>
        );
      })}
    </Stack>
  );
}

function Coefficients({ spec, unitSystem }: { spec: MaterialSpec; unitSystem: DisplayUnitSystem }) {
  if (spec.kind === 'foil') return <Small>Only its pinholes let anything through.</Small>;
  return (
    <View>
      {(['oxygen', 'water'] as const).map((gas) => (
        <Small key={gas} tone={gas}>
          {`${gas} ${coefficientInWords(gas, spec[gas].gas, unitSystem)} at ${conditionsInShort(gas, spec[gas].stated, unitSystem)}`}
        </Small>
      ))}
    </View>
  );
}

function WeakGround({ spec }: { spec: MaterialSpec }) {
  const kinds = weakGroundOf(spec);
  if (kinds.length === 0) return null;
  return <Small tone="third">{`Some numbers ${kinds.map(provenanceInWords).join(', ')}`}</Small>;
}
