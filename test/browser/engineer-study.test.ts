import { describe, expect, it } from 'vitest';
import { DEVICES, expectNoAxeViolations, screenshot, type Device, type JourneyPage } from './harness/browser';
import { openJourneyFile } from './harness/journey-file';
import { insertOwnAccount, type OwnPerson } from './harness/own-account';
import { readAnswer, type ReadAnswer } from './steps/answer';
import { drawingNames, openTable } from './steps/charts';
import { field, fillFields, sheet, shownText } from './steps/fields';
import { openNewMaterial, saveMaterial, typeFilm, type FilmDataSheet } from './steps/materials';
import { goToPlace, waitForTitle } from './steps/places';
import { followToNew, openNewStudy, saveAndReturn, typeFood, typePack, typeRoute } from './steps/question';
import { openSignIn, signIn } from './steps/sign-in';
import {
  addLayer,
  gaugeField,
  layerNames,
  saveNewWall,
  saveWallRevision,
  setBothSides,
  shownOxygenPermeance,
} from './steps/walls';

const FILMS: FilmDataSheet[] = [
  {
    name: 'PET',
    materialClass: 'polyester',
    polymer: 'PET',
    usualGauges: '12; 23',
    oxygen: { value: '1600', humidity: '50' },
    waterValue: '500',
  },
  {
    name: 'EVOH',
    materialClass: 'humidity-sensitive barrier',
    polymer: 'EVOH',
    usualGauges: '8',
    oxygen: {
      value: '10',
      humidity: '60',
      atHumidities: [
        ['60', '10'],
        ['80', '90'],
        ['90', '1000'],
      ],
    },
    waterValue: '1800',
  },
  {
    name: 'LDPE',
    materialClass: 'polyolefin',
    polymer: 'PE',
    usualGauges: '50',
    oxygen: { value: '177165', humidity: '50' },
    waterValue: '467',
  },
];

const WALL = 'PET 12 / EVOH 5 / LDPE 50';
const STUDY = 'Dry biscuits by sea';

const file = openJourneyFile();

describe.each(Object.keys(DEVICES) as Device[])('an engineer on %s', (device) => {
  it('goes from three data sheets to the days one food keeps, and what ends them', async () => {
    const { engineers } = await insertOwnAccount(file.product(), { engineers: 1 });
    const visit = await file.browser().openPage(device);
    const { width } = DEVICES[device].viewport;
    const judge = async (step: string) => {
      await screenshot(visit.page, `engineer-study-${width}-${step}`);
      await expectNoAxeViolations(visit.page);
    };

    await arrive(visit, engineers[0]!, judge);
    await makeMaterials(visit, judge);
    await ask(visit, judge);
    const asBuilt = await judgeAnswer(visit, judge);
    await turnTheWallRound(visit, judge, asBuilt);
    await visit.close();
  });
});

type Judge = (step: string) => Promise<void>;

async function arrive(visit: JourneyPage, engineer: OwnPerson, judge: Judge): Promise<void> {
  await openSignIn(visit);
  await judge('01-sign-in');
  await signIn(visit, engineer);
  await waitForTitle(visit, 'Studies');
  await visit.page.getByText('No study yet').waitFor();
  await judge('02-no-study-yet');
}

async function makeMaterials(visit: JourneyPage, judge: Judge): Promise<void> {
  for (const film of FILMS) {
    await openNewMaterial(visit);
    await typeFilm(visit, film);
    if (film.name === 'EVOH') await judge('03-material-form');
    await saveMaterial(visit, film.name);
    if (film.name !== 'EVOH') continue;
    expect(await openTable(visit, 'Table behind this curve')).toBe(3);
    await judge('04-material');
  }
  await goToPlace(visit, 'Materials');
  await visit.page.getByRole('list', { name: 'Materials' }).getByRole('listitem').nth(2).waitFor();
  await judge('05-materials');
}

async function ask(visit: JourneyPage, judge: Judge): Promise<void> {
  const { page, press } = visit;
  await openNewStudy(visit);
  await fillFields(page, { Name: STUDY, Target: '120' });

  await followToNew(visit, 'food');
  await typeFood(visit, 'Dry biscuits');
  await judge('06-food-form');
  await saveAndReturn(visit, 'Save food');

  await followToNew(visit, 'pack');
  await typePack(visit, 'Pouch 160 × 230');
  await judge('07-pack-form');
  await saveAndReturn(visit, 'Save pack');

  await followToNew(visit, 'route');
  await typeRoute(visit, 'Sea, then shop');
  await judge('08-route-form');
  await saveAndReturn(visit, 'Save route');

  await followToNew(visit, 'wall');
  await judge('09-wall-empty');
  await buildWall(visit, judge);
  await saveNewWall(visit);
  await waitForTitle(visit, 'New study');

  // What was typed before the four trips is still there, and what was made is chosen.
  expect(await field(page, 'Name').inputValue()).toBe(STUDY);
  expect(await field(page, 'Target').inputValue()).toBe('120');
  const chosen = { Food: 'Dry biscuits', Pack: 'Pouch 160 × 230', Route: 'Sea, then shop', Wall: WALL };
  for (const [label, name] of Object.entries(chosen)) {
    const shown = () => field(page, label).locator('option:checked').innerText();
    await expect.poll(shown, { message: label }).toBe(name);
  }
  await judge('12-study-form');
  await press(page.getByRole('button', { name: 'Compute and keep' }));
  await waitForTitle(visit, STUDY);
}

/** Both sides at 60, 80 and 90 % and 23 °C; domain knowledge gives the three figures. */
const PERMEANCE_BY_HUMIDITY = { '60': '1.97', '80': '15.8', '90': '78.2' };

async function buildWall(visit: JourneyPage, judge: Judge): Promise<void> {
  const { page } = visit;
  await addLayer(visit, { material: 'PET', gauge: '12 µm' });
  await addLayer(visit, { material: 'EVOH', gauge: '8 µm' });
  await addLayer(visit, { material: 'LDPE', gauge: '50 µm' });
  await gaugeField(page, 'EVOH').fill('5');
  expect(await layerNames(page)).toEqual(['PET', 'EVOH', 'LDPE']);
  expect(await field(page, 'Name').inputValue()).toBe(WALL);
  for (const [humidity, figures] of Object.entries(PERMEANCE_BY_HUMIDITY)) {
    await setBothSides(page, humidity);
    await expect.poll(() => shownOxygenPermeance(page)).toBe(`${figures} cm³/(m²·day·atm)`);
    if (humidity === '80') await judge('10-wall-at-80');
  }
  // A pack's own sides: moist outside, dry inside. Here it matters which way round the wall faces.
  expect(await shownText(sheet(page, 'Turned round'))).toMatch(
    /EVOH then sits at \d+ % humidity instead of \d+ % humidity/,
  );
  expect(await openTable(visit, 'Table behind this chart')).toBe(4);
  await judge('11-wall');
}

const TABLES = [
  { button: 'Table of the ruler', least: 1 },
  { button: 'Table of the stairs', least: 4 },
  { button: 'Table of the shares', least: 3 },
  { button: 'Table of oxygen taken up', least: 5 },
  { button: 'Table of moisture', least: 5 },
];
/** The last is the wall itself, whose figures stand on it and in the table of the layers. */
const DRAWINGS = [
  'Days on the shelf',
  'Moisture',
  'Oxygen taken up',
  'Partial pressures through the wall',
  `Section of ${WALL}`,
];

async function judgeAnswer(visit: JourneyPage, judge: Judge): Promise<ReadAnswer> {
  const { page } = visit;
  const answer = await readAnswer(page);
  await judge('13-answer');
  expect(answer.oxygenDay).toBeGreaterThan(0);
  expect(answer.moistureDay).toBeGreaterThan(0);
  expect(answer.first).toBe(answer.oxygenDay < answer.moistureDay ? 'oxygen' : 'moisture');
  const firstDay = Math.min(answer.oxygenDay, answer.moistureDay);
  expect(answer.sentence).toContain(answer.first === 'oxygen' ? 'oxygen uptake' : 'moisture');
  expect(answer.sentence).toMatch(new RegExp(`\\b${firstDay}\\b`));

  const drawings = await drawingNames(page);
  expect([...new Set(drawings)].sort()).toEqual(expect.arrayContaining(DRAWINGS));
  for (const { button, least } of TABLES) {
    expect(await openTable(visit, button), button).toBeGreaterThanOrEqual(least);
  }
  await judge('14-tables');
  return answer;
}

async function turnTheWallRound(visit: JourneyPage, judge: Judge, asBuilt: ReadAnswer): Promise<void> {
  const { page, press } = visit;
  const turned = sheet(page, 'Turned round');
  const why =
    /EVOH sits at [\d.]+ % humidity as laid and at [\d.]+ % turned round, and its oxygen barrier depends on/;
  expect(await shownText(turned)).toMatch(why);
  const foretold = /Day of the oxygen uptake limit, whole route\s+(\d+)\s+(\d+)/.exec(
    await shownText(turned),
  );
  expect(foretold?.[1]).toBe(String(asBuilt.oxygenDay));

  await goToPlace(visit, 'Walls');
  await press(page.getByRole('main').getByRole('list', { name: 'Walls' }).getByRole('link').first());
  await waitForTitle(visit, WALL);
  await press(page.getByRole('button', { name: 'Turn round', exact: true }));
  await expect.poll(() => layerNames(page)).toEqual(['LDPE', 'EVOH', 'PET']);
  await judge('15-wall-turned');
  await saveWallRevision(visit);
  await page.getByText(/revision 2\.$/).waitFor();

  await goToPlace(visit, 'Studies');
  await press(
    page
      .getByRole('list', { name: /^Studies/ })
      .getByRole('link')
      .first(),
  );
  await page.getByText('Newer data exist than this answer used').first().waitFor();
  await judge('16-study-outdated');
  await press(page.getByRole('button', { name: 'Run again' }));
  await page.getByText('no. 2', { exact: true }).waitFor();
  const answer = await readAnswer(page);
  await judge('17-answer-turned');
  expect(answer.oxygenDay).not.toBe(asBuilt.oxygenDay);
  // What the first answer foretold for the turned wall is what turning it gives.
  expect(String(answer.oxygenDay)).toBe(foretold?.[2]);
  expect(await shownText(turned)).toMatch(why);
}
