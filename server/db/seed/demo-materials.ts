import type { MaterialSpec } from '../../../shared/contract/materials';
import { demoMaterials } from './demo-account';
import { libraryMaterials } from './library-materials';

/** The demo's own foils: the library's, with other pinholes. */
export function demoMaterialSpecs(): { key: string; spec: MaterialSpec }[] {
  const library = new Map(libraryMaterials().map(({ libraryId, spec }) => [libraryId, spec]));
  return demoMaterials.map(({ key, basedOn, name, defects, notes }) => {
    const base = library.get(basedOn);
    if (base?.kind !== 'foil') throw new Error(`${basedOn} is no foil of the library.`);
    const provenance = [
      ...base.provenance.filter((entry) => !entry.field.startsWith('pinholes')),
      {
        field: 'pinholes',
        kind: 'invented' as const,
        source: 'invented for the demo',
        note: 'Number and diameter after flexing are invented to show the effect; no measurement stands behind them.',
      },
    ];
    return { key, spec: { ...base, name, defects, notes, provenance } };
  });
}
