import type { KeptMaterial } from '../../api/kept-things-queries';

/** Every word of the search must occur in name, class or polymer family; sorted by name. */
export function matchingMaterials(materials: KeptMaterial[], search: string): KeptMaterial[] {
  const words = search
    .toLowerCase()
    .split(/\s+/)
    .filter((word) => word !== '');
  return materials
    .filter(({ revision: { spec } }) => {
      const text = `${spec.name} ${spec.material_class} ${spec.polymer_family}`.toLowerCase();
      return words.every((word) => text.includes(word));
    })
    .sort((a, b) => a.revision.spec.name.localeCompare(b.revision.spec.name, 'en'));
}
