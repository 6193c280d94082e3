import type { ProvenanceEntry } from '../../../shared/contract/materials';
import { routeSpecSchema, type RouteSpec } from '../../../shared/contract/routes';
import type { DisplayKindName, DisplayUnitSystem } from '../../../shared/units/format';
import { FieldReader, fieldText } from '../../api/kept-forms/typed-quantity';
import { validateKeptForm } from '../../api/kept-forms/validate-kept-form';

export interface LegFormValues {
  /** Stays with the leg while it moves; only for this form. */
  key: string;
  name: string;
  temperature_C: string;
  relative_humidity: string;
  days: string;
}

export interface RouteFormValues {
  name: string;
  route: { legs: LegFormValues[]; after_last: 'hold' | 'repeat' };
  horizon_days: string;
  notes: string;
  ground: { kind: ProvenanceEntry['kind']; source: string };
  nextKey: number;
}

/** The provenance entry that the form itself keeps: where the conditions of the legs come from. */
const GROUND_FIELD = 'legs';

export const NEW_ROUTE: RouteSpec = {
  name: '',
  route: {
    legs: [{ name: 'Warehouse', temperature_C: 23, relative_humidity: 0.5, days: 90 }],
    after_last: 'hold',
  },
  horizon_days: 1825,
  notes: '',
  provenance: [],
};

export function routeFormValues(spec: RouteSpec, unitSystem: DisplayUnitSystem): RouteFormValues {
  const ground = groundOf(spec);
  return {
    name: spec.name,
    route: {
      legs: spec.route.legs.map((leg, index) => ({
        key: `leg-${index + 1}`,
        name: leg.name ?? '',
        temperature_C: fieldText(leg.temperature_C, 'temperature_C', unitSystem),
        relative_humidity: fieldText(leg.relative_humidity, 'fraction_as_percent', unitSystem),
        days: fieldText(leg.days, 'days', unitSystem),
      })),
      after_last: spec.route.after_last,
    },
    horizon_days: fieldText(spec.horizon_days, 'days', unitSystem),
    notes: spec.notes,
    ground: { kind: ground?.kind ?? 'common-practice', source: ground?.source ?? '' },
    nextKey: spec.route.legs.length + 1,
  };
}

/** The form's own entry, or what the library says of its temperatures. */
function groundOf(spec: RouteSpec): ProvenanceEntry | undefined {
  return spec.provenance.find((entry) => entry.field === GROUND_FIELD) ?? spec.provenance[0];
}

export interface RouteFormContext {
  unitSystem: DisplayUnitSystem;
  before: RouteSpec;
}

export function routeSpecFrom(values: RouteFormValues, { unitSystem, before }: RouteFormContext): RouteSpec {
  const reader = new FieldReader(unitSystem);
  const legs = values.route.legs.map((leg, index) => {
    const path = `route.legs[${index}]`;
    return {
      ...(leg.name.trim() === '' ? {} : { name: leg.name.trim() }),
      temperature_C: reader.readRequired(`${path}.temperature_C`, leg.temperature_C, {
        kind: 'temperature_C',
      }),
      relative_humidity: reader.readRequired(`${path}.relative_humidity`, leg.relative_humidity, {
        kind: 'fraction_as_percent',
      }),
      days: reader.readRequired(`${path}.days`, leg.days, { kind: 'days' }),
    };
  });
  return {
    name: values.name.trim(),
    route: { legs, after_last: values.route.after_last },
    horizon_days: reader.readRequired('horizon_days', values.horizon_days, {
      kind: 'days',
      before: before.horizon_days,
    }),
    notes: values.notes,
    provenance: provenanceFrom(values, legs, before),
    ...reader.typed(),
  };
}

/** Other conditions are no longer those of the library's source: then the form's own words stand alone. */
function provenanceFrom(
  values: RouteFormValues,
  legs: RouteSpec['route']['legs'],
  before: RouteSpec,
): ProvenanceEntry[] {
  const source = values.ground.source.trim();
  const ground = groundOf(before);
  const isSameRoute = JSON.stringify(legs) === JSON.stringify(before.route.legs);
  if (isSameRoute && ground?.kind === values.ground.kind && ground.source === source)
    return before.provenance;
  const own: ProvenanceEntry = { field: GROUND_FIELD, kind: values.ground.kind, source, note: '' };
  return isSameRoute ? [own, ...before.provenance.filter((entry) => entry.field !== GROUND_FIELD)] : [own];
}

export function validateRouteForm(context: RouteFormContext) {
  return validateKeptForm<RouteFormValues>({
    schema: routeSpecSchema,
    toSpec: (values) => routeSpecFrom(values, context),
    kindAt: kindOfRouteField,
    labelAt: labelOfRouteField,
    unitSystem: context.unitSystem,
  });
}

function kindOfRouteField(path: string): DisplayKindName | null {
  if (path.endsWith('temperature_C')) return 'temperature_C';
  if (path.endsWith('relative_humidity')) return 'fraction_as_percent';
  return path.endsWith('days') ? 'days' : null;
}

/** As the page calls it, and which leg where each has such a field. */
function labelOfRouteField(path: string): string | undefined {
  if (path === 'horizon_days') return 'Look ahead';
  const leg = /^route\.legs\[(\d+)\]\.(\w+)$/.exec(path);
  const words = LEG_LABELS[leg?.[2] ?? ''];
  return leg === null || words === undefined ? undefined : `Leg ${Number(leg[1]) + 1}, ${words}`;
}

const LEG_LABELS: Partial<Record<string, string>> = {
  temperature_C: 'temperature',
  relative_humidity: 'humidity',
  days: 'days',
};
