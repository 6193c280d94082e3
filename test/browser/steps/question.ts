import type { JourneyPage } from '../harness/browser';
import { choice, field, fillFields, sheet } from './fields';
import { goToPlace, waitForTitle } from './places';

/** The parts of a question, each made on its own form, from the study's form and back to it. */

export async function openNewStudy(visit: JourneyPage): Promise<void> {
  await goToPlace(visit, 'Studies');
  await visit.press(visit.page.getByRole('link', { name: /^(New study|Start the first study)$/ }).first());
  await waitForTitle(visit, 'New study');
}

export async function followToNew(
  visit: JourneyPage,
  thing: 'food' | 'pack' | 'route' | 'wall',
): Promise<void> {
  await visit.press(visit.page.getByRole('link', { name: `Make a new ${thing}` }));
  await waitForTitle(visit, `New ${thing}`);
}

/** Pressing save leads back to the study, which then holds what was made. */
export async function saveAndReturn(visit: JourneyPage, button: string): Promise<void> {
  await visit.press(visit.page.getByRole('button', { name: button }));
  await waitForTitle(visit, 'New study');
}

/** A dry food that both gases can spoil: 40 mg oxygen per kg, or 3.71 g water per 100 g dry. */
export async function typeFood({ page, press }: JourneyPage, name: string): Promise<void> {
  await fillFields(page, { Name: name, 'Mass as packed': '200' });
  const moisture = sheet(page, 'Moisture');
  await press(choice(moisture, 'Its moisture', 'GAB isotherm'));
  await fillFields(moisture, {
    'Monolayer moisture Xm': '2.75',
    C: '10',
    K: '0.918',
    'Moisture as packed': '2',
  });
  await fillFields(sheet(page, 'Limits'), { 'Oxygen taken up': '40', 'Highest moisture': '3.71' });
}

export async function typePack({ page }: JourneyPage, name: string): Promise<void> {
  await fillFields(page, { Name: name, Width: '160', Height: '230', Headspace: '120' });
  await field(page, 'Oxygen in it at the start').fill('0.5');
}

/** A moist month at sea, then a shop. */
export async function typeRoute({ page, press }: JourneyPage, name: string): Promise<void> {
  await field(page, 'Name').fill(name);
  await fillFields(page.getByRole('listitem', { name: 'Leg 1', exact: true }), {
    'Leg 1': 'Sea',
    Temperature: '30',
    Humidity: '80',
    Days: '30',
  });
  await press(page.getByRole('button', { name: 'Add a leg' }));
  await fillFields(page.getByRole('listitem', { name: 'Leg 2', exact: true }), {
    'Leg 2': 'Shop',
    Temperature: '23',
    Humidity: '60',
    Days: '300',
  });
}
