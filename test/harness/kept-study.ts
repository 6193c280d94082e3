import { aFilm, aFood, aLaminate, aPack, aRoute, aStudy } from '../../server/db/seed/spec-builders';
import type { TestAnswer, TestClient } from './test-server';

/** Ids of a study and everything it uses, made through the API by an engineer. */
export interface KeptStudy {
  materials: string;
  laminates: string;
  packs: string;
  foods: string;
  routes: string;
  studies: string;
  result: string;
  materialRevision: string;
}

export function pathOf(client: TestClient, collection: string): string {
  return `/api/accounts/${client.accountId}/${collection}`;
}

export async function keep(
  client: TestClient,
  collection: string,
  spec: unknown,
): Promise<TestAnswer['json']> {
  const answer = await client.send('POST', pathOf(client, collection), { body: { spec } });
  if (answer.status !== 201) throw new Error(`POST ${collection} answered ${answer.status}: ${answer.text}`);
  return answer.json;
}

export async function keepStudy(client: TestClient): Promise<KeptStudy> {
  const material = await keep(client, 'materials', aFilm());
  const laminate = await keep(
    client,
    'laminates',
    aLaminate([{ id: material.id, revisionId: material.revision.id }], { thicknessUm: 50 }),
  );
  const pack = await keep(client, 'packs', aPack());
  const food = await keep(client, 'foods', aFood());
  const route = await keep(client, 'routes', aRoute());
  const parts = { foodId: food.id, packId: pack.id, routeId: route.id, laminateIds: [laminate.id] };
  const study = await keep(client, 'studies', aStudy(parts));
  return {
    materials: material.id,
    laminates: laminate.id,
    packs: pack.id,
    foods: food.id,
    routes: route.id,
    studies: study.id,
    result: study.latest_result.id,
    materialRevision: material.revision.id,
  };
}
