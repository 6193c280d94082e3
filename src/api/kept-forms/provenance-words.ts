import type { MaterialSpec, ProvenanceEntry } from '../../../shared/contract/materials';

export type ProvenanceKind = ProvenanceEntry['kind'];

const KIND_WORDS: Record<ProvenanceKind, string> = {
  published: 'read at the source',
  memory: 'from memory',
  'common-practice': 'common practice',
  derived: 'worked out from a source',
  invented: 'invented for the demo',
  'supplier statement': 'stated by the supplier',
  'own measurement': 'own measurement',
};

export function provenanceInWords(kind: ProvenanceKind): string {
  return KIND_WORDS[kind];
}

/** Kinds that an answer must admit to leaning on. */
const WEAK: readonly ProvenanceKind[] = ['memory', 'invented', 'common-practice'];

/** 'from memory', 'invented for the demo'… where the coefficients of either gas, or the pinholes, rest on that. */
export function weakGroundOf(material: Pick<MaterialSpec, 'provenance'>): ProvenanceKind[] {
  const found = new Set(
    material.provenance.filter((entry) => isCoefficient(entry.field)).map((entry) => entry.kind),
  );
  return WEAK.filter((kind) => found.has(kind));
}

function isCoefficient(field: string): boolean {
  return /^(oxygen|water|pinholes|defects|derivation)\b/.test(field);
}

/** 'oxygen.activationEnergyKjPerMol' reads 'oxygen, activation energy'. */
export function provenanceFieldInWords(field: string): string {
  const [head = '', ...rest] = field.split('.');
  const tail = rest.join('.');
  const headWords = FIELD_WORDS[head] ?? spaced(head);
  return tail === '' ? headWords : `${headWords}, ${fieldTail(tail)}`;
}

function fieldTail(tail: string): string {
  const [name = '', at] = tail.split('@');
  const words = FIELD_WORDS[name] ?? spaced(name);
  return at === undefined ? words : `${words} at ${Math.round(Number(at) * 100)} %`;
}

const FIELD_WORDS: Record<string, string> = {
  temperatureC: 'temperature',
  activationEnergyKjPerMol: 'activation energy',
  activation_energy_J_per_mol: 'activation energy',
  humidityCurve: 'humidity curve',
  humidity_curve: 'humidity curve',
  geometricSd: 'spread',
  geometric_sd: 'spread',
  measuredRangeC: 'measured temperatures',
  densityKgPerM3: 'density',
  density_kg_per_m3: 'density',
  priceEurPerKg: 'price per kg',
  price_per_kg: 'price per kg',
  priceEurPerM2: 'price per m²',
  price_per_m2: 'price per m²',
  typicalGaugesUm: 'usual gauges',
  typical_gauges_um: 'usual gauges',
  derivation: 'how the coating was separated from its film',
};

function spaced(name: string): string {
  return name
    .replace(/_/g, ' ')
    .replace(/([a-z])([A-Z])/g, '$1 $2')
    .toLowerCase();
}
