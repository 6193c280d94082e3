import type { MaterialSpec } from '../../../shared/contract/materials';
import { provenanceInWords, weakGroundOf } from '../../api/kept-forms/provenance-words';

/** Which weak ground the coefficients of a material stand on; '' where all were read or measured. */
export function weakGroundInWords(material: Pick<MaterialSpec, 'provenance'>): string {
  const kinds = weakGroundOf(material);
  return kinds.length === 0 ? '' : `Some numbers ${kinds.map(provenanceInWords).join(', ')}`;
}
