import { View } from 'react-native';
import Svg from 'react-native-svg';
import { layoutSection } from '../../shared/charts/section-layout';
import { HatchedRect } from './hatched-rect';
import { layerHatch } from './section-geometry';
import type { DrawnLayer } from './section-geometry';

export interface MiniSectionProps {
  layers: Omit<DrawnLayer, 'gaugeLabel'>[];
  width?: number;
  height?: number;
}

/** The wall as a strip on a card. A mark beside the wall's name, so readers do not hear it. */
export function MiniSection({ layers, width = 112, height = 14 }: MiniSectionProps) {
  const drawn = layers.map((layer): DrawnLayer => ({ ...layer, gaugeLabel: '' }));
  const { boxes } = layoutSection(
    drawn.map((layer) => ({
      thicknessUm: layer.thicknessUm,
      kind: layer.kind,
      isThinLine: layer.materialClass === 'adhesive' || layer.materialClass === 'ink',
      labelWidth: 0,
    })),
    width - 1,
  );
  return (
    <Svg width={width} height={height} aria-hidden>
      {drawn.map((layer, index) => {
        const box = boxes[index];
        if (box === undefined) return null;
        return (
          <HatchedRect
            key={index}
            rect={{ x: box.x + 0.5, y: 0.5, width: box.width, height: height - 1 }}
            hatch={layerHatch(layer)}
            scale={0.7}
          />
        );
      })}
    </Svg>
  );
}

/** One layer's hatch beside its name. */
export function HatchSwatch({ layer }: { layer: Omit<DrawnLayer, 'gaugeLabel' | 'thicknessUm'> }) {
  return (
    <View style={{ flexShrink: 0 }}>
      <Svg width={24} height={14} aria-hidden>
        <HatchedRect
          rect={{ x: 0.5, y: 0.5, width: 23, height: 13 }}
          hatch={layerHatch({ ...layer, thicknessUm: 1, gaugeLabel: '' })}
          scale={0.7}
        />
      </Svg>
    </View>
  );
}
