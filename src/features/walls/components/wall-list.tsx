import { View } from 'react-native';
import { MiniSection } from '../../../charts/mini-section';
import type { KeptLaminate, KeptMaterial } from '../../../api/kept-things-queries';
import { useAccount, useUnitSystem } from '../../../session';
import { Row, Small, SPACE, Stack } from '../../../ui';
import { totalGauge } from '../shown-layer';

export interface WallListProps {
  walls: KeptLaminate[];
  materials: KeptMaterial[];
  currentId?: string;
}

/** Each wall as a strip of its section, with its layers counted and its gauges added. */
export function WallList({ walls, materials, currentId }: WallListProps) {
  const account = useAccount();
  const unitSystem = useUnitSystem();
  const specById = new Map(materials.map((material) => [material.id, material.revision.spec]));
  return (
    <Stack gap="x1" role="list" label="Walls">
      {walls.map((wall, index) => {
        const { layers, name } = wall.revision.spec;
        const drawn = layers.flatMap((layer) => {
          const spec = specById.get(layer.material_id);
          if (spec === undefined) return [];
          return [
            {
              name: spec.name,
              materialClass: spec.material_class,
              polymerFamily: spec.polymer_family,
              kind: spec.kind,
              thicknessUm: layer.thickness_um,
            },
          ];
        });
        const count = layers.length === 1 ? '1 layer' : `${layers.length} layers`;
        return (
          <View key={wall.id} role="listitem">
            <Row
              href={`${account.basePath}/walls/${wall.id}`}
              label={name}
              isCurrent={wall.id === currentId}
              isLast={index === walls.length - 1}
              detail={
                <View style={{ gap: SPACE.x1, paddingTop: 2 }}>
                  {drawn.length === 0 ? null : <MiniSection layers={drawn} width={160} />}
                  <Small>{`${count}, ${totalGauge(
                    layers.map((layer) => layer.thickness_um),
                    unitSystem,
                  )}`}</Small>
                </View>
              }
            />
          </View>
        );
      })}
    </Stack>
  );
}
