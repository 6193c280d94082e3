import type { RouteSpec } from '../../../shared/contract/routes';
import library from './library/routes.json';
import { provenanceOf } from './library-provenance';

const HORIZON_DAYS = 3 * 365;
const YEAR_DAYS = 365;

/** Constant zones, a year of months of real cities, and invented transport chains. */
export function libraryRoutes(): { libraryId: string; spec: RouteSpec }[] {
  return [...zones(), ...climates(), ...chains()];
}

function zones() {
  return library.zones.map((zone) => ({
    libraryId: zone.id,
    spec: {
      ...commonOf(zone.name, zone.provenance),
      route: {
        legs: [
          {
            name: zone.name,
            temperature_C: zone.temperatureC,
            relative_humidity: zone.relativeHumidity,
            days: YEAR_DAYS,
          },
        ],
        after_last: 'hold' as const,
      },
      notes: `${zone.standard}; ${zone.edition}. A storage condition, not a climate.`,
    },
  }));
}

function climates() {
  return library.climates.map((climate) => ({
    libraryId: climate.id,
    spec: {
      ...commonOf(climate.name, climate.provenance),
      route: { legs: climate.months.map(legOf), after_last: 'repeat' as const },
      notes: `${climate.notes} Monthly means, outdoors in the shade; days are hotter, nights cooler.`.trim(),
    },
  }));
}

function chains() {
  return library.chains.map((chain) => ({
    libraryId: chain.id,
    spec: {
      ...commonOf(chain.name, chain.provenance),
      route: { legs: chain.legs.map(legOf), after_last: 'hold' as const },
      notes: chain.notes,
    },
  }));
}

function commonOf(name: string, provenance: Parameters<typeof provenanceOf>[0]) {
  return { name, horizon_days: HORIZON_DAYS, provenance: provenanceOf(provenance, library.sources) };
}

function legOf(leg: { name: string; temperatureC: number; relativeHumidity: number; days: number }) {
  return {
    name: leg.name,
    temperature_C: leg.temperatureC,
    relative_humidity: leg.relativeHumidity,
    days: leg.days,
  };
}
