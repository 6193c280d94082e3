import { layoutSection } from '../../shared/charts/section-layout';
import type { SectionLayout } from '../../shared/charts/section-layout';
import { hatchOf } from '../../shared/charts/hatching';
import type { Hatch } from '../../shared/charts/hatching';
import { monoWidth } from './chart-text';

/** A layer as the drawings take it, outside face first. */
export interface DrawnLayer {
  name: string;
  materialClass: string;
  polymerFamily?: string;
  kind: 'film' | 'coating' | 'foil';
  thicknessUm: number;
  /** Number and unit, as on the dimension line: '12 µm'. */
  gaugeLabel: string;
}

export interface SectionGeometry {
  /** Where the section begins; air to the left of it, headspace to the right. */
  sectionX: number;
  sectionWidth: number;
  layout: SectionLayout;
}

const AIR_PX = 34;

/** The same in the section and in the stairs under it, so that faces stand above one another. */
export function sectionGeometry(layers: DrawnLayer[], width: number): SectionGeometry {
  const sectionWidth = width - 2 * AIR_PX;
  return {
    sectionX: AIR_PX,
    sectionWidth,
    layout: layoutSection(
      layers.map((layer) => ({
        thicknessUm: layer.thicknessUm,
        kind: layer.kind,
        isThinLine: layer.materialClass === 'adhesive' || layer.materialClass === 'ink',
        labelWidth: monoWidth(layer.gaugeLabel),
      })),
      sectionWidth,
    ),
  };
}

export function layerHatch(layer: DrawnLayer): Hatch {
  return hatchOf({
    materialClass: layer.materialClass,
    polymerFamily: layer.polymerFamily ?? '',
    name: layer.name,
  });
}
