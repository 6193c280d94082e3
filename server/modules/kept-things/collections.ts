import type { Schema } from 'yup';
import { closedObject, noteField } from '../../../shared/contract/fields';
import { foodSpecSchema, type FoodSpec } from '../../../shared/contract/foods';
import {
  createRequestSchema,
  keptThingSchema,
  pageSchema,
  reviseRequestSchema,
  namedRevisionSchema,
  revisionSchema,
  type Collection,
} from '../../../shared/contract/kept-things';
import { laminateSpecSchema, type LaminateSpec } from '../../../shared/contract/laminates';
import { materialSpecSchema, type MaterialSpec } from '../../../shared/contract/materials';
import { packSpecSchema, type PackSpec } from '../../../shared/contract/packs';
import { routeSpecSchema, type RouteSpec } from '../../../shared/contract/routes';
import type { Queryable } from '../../db/client';
import type { ThingTables } from '../../db/kept-thing-store';
import {
  foodRevisions,
  foods,
  laminateRevisions,
  laminates,
  materialRevisions,
  materials,
  packRevisions,
  packs,
  routeRevisions,
  routes,
} from '../../db/schema';
import { schemaOf, type ResponseSchema } from '../../http/route-definition';
import { checkFood } from './check-food';
import { checkLaminate } from './check-laminate';
import { checkMaterial } from './check-material';
import { checkPack } from './check-pack';
import { checkTypedValues } from './check-typed-values';

interface Checked<Spec> {
  accountId: string;
  spec: Spec;
  base?: Spec;
}

/** What tells one collection from another; everything else is the same for all. */
export interface CollectionDefinition<Spec extends { name: string }> {
  collection: Collection;
  /** As the audit log and messages call one of them. */
  subjectKind: string;
  tables: ThingTables<Spec>;
  createSchema: Schema<{ spec: Spec }>;
  reviseSchema: Schema<{ spec: Spec; note?: string }>;
  thingSchema: ResponseSchema;
  pageSchema: ResponseSchema;
  revisionPageSchema: ResponseSchema;
  /** Refuses what the schema cannot see, with the path of the field below `spec`. `base`: what is being revised. */
  check: (db: Queryable, checked: Checked<Spec>) => Promise<void>;
}

const materialRevisionSchema = closedObject({
  ...revisionSchema(closedObject({})).fields,
  spec: materialSpecSchema,
});
const namedMaterialRevisionSchema = closedObject({
  ...namedRevisionSchema(closedObject({})).fields,
  spec: materialSpecSchema,
});
const materialThingSchema = closedObject({
  ...keptThingSchema(closedObject({})).fields,
  revision: materialRevisionSchema.required(),
});

export const MATERIALS: CollectionDefinition<MaterialSpec> = {
  collection: 'materials',
  subjectKind: 'material',
  tables: { things: materials, revisions: materialRevisions },
  createSchema: schemaOf(closedObject({ spec: materialSpecSchema })),
  reviseSchema: schemaOf(closedObject({ spec: materialSpecSchema, note: noteField('Note').optional() })),
  thingSchema: materialThingSchema,
  pageSchema: pageSchema(materialThingSchema),
  revisionPageSchema: pageSchema(namedMaterialRevisionSchema),
  check: async (_db, { spec }) => checkMaterial(spec),
};

export const LAMINATES: CollectionDefinition<LaminateSpec> = {
  collection: 'laminates',
  subjectKind: 'laminate',
  tables: { things: laminates, revisions: laminateRevisions },
  createSchema: schemaOf(createRequestSchema(laminateSpecSchema)),
  reviseSchema: schemaOf(reviseRequestSchema(laminateSpecSchema)),
  thingSchema: keptThingSchema(laminateSpecSchema),
  pageSchema: pageSchema(keptThingSchema(laminateSpecSchema)),
  revisionPageSchema: pageSchema(namedRevisionSchema(laminateSpecSchema)),
  async check(db, checked) {
    checkTypedValues(checked.spec);
    await checkLaminate(db, checked);
  },
};

export const PACKS: CollectionDefinition<PackSpec> = {
  collection: 'packs',
  subjectKind: 'pack',
  tables: { things: packs, revisions: packRevisions },
  createSchema: schemaOf(createRequestSchema(packSpecSchema)),
  reviseSchema: schemaOf(reviseRequestSchema(packSpecSchema)),
  thingSchema: keptThingSchema(packSpecSchema),
  pageSchema: pageSchema(keptThingSchema(packSpecSchema)),
  revisionPageSchema: pageSchema(namedRevisionSchema(packSpecSchema)),
  async check(db, checked) {
    checkTypedValues(checked.spec);
    await checkPack(db, checked);
  },
};

export const FOODS: CollectionDefinition<FoodSpec> = {
  collection: 'foods',
  subjectKind: 'food',
  tables: { things: foods, revisions: foodRevisions },
  createSchema: schemaOf(createRequestSchema(foodSpecSchema)),
  reviseSchema: schemaOf(reviseRequestSchema(foodSpecSchema)),
  thingSchema: keptThingSchema(foodSpecSchema),
  pageSchema: pageSchema(keptThingSchema(foodSpecSchema)),
  revisionPageSchema: pageSchema(namedRevisionSchema(foodSpecSchema)),
  async check(_db, { spec }) {
    checkTypedValues(spec);
    checkFood(spec);
  },
};

export const ROUTES: CollectionDefinition<RouteSpec> = {
  collection: 'routes',
  subjectKind: 'route',
  tables: { things: routes, revisions: routeRevisions },
  createSchema: schemaOf(createRequestSchema(routeSpecSchema)),
  reviseSchema: schemaOf(reviseRequestSchema(routeSpecSchema)),
  thingSchema: keptThingSchema(routeSpecSchema),
  pageSchema: pageSchema(keptThingSchema(routeSpecSchema)),
  revisionPageSchema: pageSchema(namedRevisionSchema(routeSpecSchema)),
  check: async (_db, { spec }) => checkTypedValues(spec),
};
