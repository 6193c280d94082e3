import type { JourneyPage } from '../harness/browser';
import { choice, field, fillFields, sheet } from './fields';
import { goToPlace, waitForTitle } from './places';

/** A film as its data sheet states it, in the words of the sheet. */
export interface FilmDataSheet {
  name: string;
  materialClass: string;
  polymer: string;
  usualGauges: string;
  /** cm³·µm/(m²·day·atm) at 23 °C, and what it comes to at further humidities. */
  oxygen: { value: string; humidity: string; atHumidities?: [humidity: string, value: string][] };
  /** g·µm/(m²·day) at 38 °C between 90 % and nothing. */
  waterValue: string;
}

export async function openNewMaterial(visit: JourneyPage): Promise<void> {
  await goToPlace(visit, 'Materials');
  await visit.press(visit.page.getByRole('link', { name: 'New material' }).first());
  await waitForTitle(visit, 'New material');
}

export async function typeFilm({ page, press }: JourneyPage, film: FilmDataSheet): Promise<void> {
  await field(page, 'Name').fill(film.name);
  await field(page, 'Class').selectOption({ label: film.materialClass });
  await fillFields(page, { Polymer: film.polymer, 'Usual gauges, µm': film.usualGauges });

  const oxygen = sheet(page, 'Oxygen');
  await fillFields(oxygen, {
    'Oxygen value': film.oxygen.value,
    'Measured at': '23',
    'Both sides at': film.oxygen.humidity,
  });
  await field(oxygen, 'Unit').selectOption({ label: 'cm³(STP)·µm/(m²·day·atm)' });
  const curve = film.oxygen.atHumidities ?? [];
  if (curve.length > 0) await press(choice(oxygen, 'Humidity', 'Values'));
  for (const [index, [humidity, value]] of curve.entries()) {
    if (index > 0) await press(oxygen.getByRole('button', { name: 'Add a point' }));
    await fillFields(oxygen, { [`Humidity ${index + 1}`]: humidity, [`Value ${index + 1}`]: value });
  }

  const water = sheet(page, 'Water vapour');
  await fillFields(water, { 'Water value': film.waterValue, 'Moist side': '90', 'Dry side': '0' });
  await field(water, 'Unit').selectOption({ label: 'g·µm/(m²·day)' });
}

export async function saveMaterial(visit: JourneyPage, name: string): Promise<void> {
  await visit.press(visit.page.getByRole('button', { name: 'Save material' }));
  await waitForTitle(visit, name);
}
