import {
  ArraySchema,
  BooleanSchema,
  MixedSchema,
  NumberSchema,
  ObjectSchema,
  StringSchema,
  type Lazy,
  type Schema,
} from 'yup';
import {
  LIMIT_ANSWER_SCHEMAS,
  limitAnswerSchema,
  TEST_IN_ANSWER_SCHEMAS,
  testInAnswerSchema,
} from '../../../shared/contract/evaluation-answer';
import { TEST_SCHEMAS, transmissionTestSchema } from '../../../shared/contract/evaluations';
import { MATERIAL_SCHEMAS, materialSpecSchema } from '../../../shared/contract/materials';
import { PACK_FORM_SCHEMAS, packFormSchema } from '../../../shared/contract/packs';
import {
  ISOTHERM_SCHEMAS,
  isothermSchema,
  LAYER_SCHEMAS,
  layerSchema,
} from '../../../shared/contract/storage-description';

export type JsonSchema = Record<string, unknown>;
type AnySchema = Schema<unknown> | Lazy<unknown>;

interface Choice {
  schemas: readonly AnySchema[];
  isOptional?: boolean;
}

/** A lazy schema does not describe itself: these are the shapes it chooses from. */
const CHOICES = new Map<unknown, Choice>([
  [layerSchema, { schemas: LAYER_SCHEMAS }],
  [isothermSchema, { schemas: ISOTHERM_SCHEMAS, isOptional: true }],
  [transmissionTestSchema, { schemas: TEST_SCHEMAS }],
  [testInAnswerSchema, { schemas: TEST_IN_ANSWER_SCHEMAS }],
  [limitAnswerSchema, { schemas: LIMIT_ANSWER_SCHEMAS, isOptional: true }],
  [materialSpecSchema, { schemas: MATERIAL_SCHEMAS }],
  [packFormSchema, { schemas: PACK_FORM_SCHEMAS }],
]);

/** Schemas that are named components; wherever one is met, it is referred to. */
export class JsonSchemaWriter {
  readonly components: Record<string, JsonSchema> = {};
  private readonly names: ReadonlyMap<unknown, string>;

  constructor(named: Readonly<Record<string, AnySchema>>) {
    this.names = new Map(Object.entries(named).map(([name, schema]) => [schema, name]));
    for (const [name, schema] of Object.entries(named)) this.components[name] = this.describe(schema);
  }

  /** JSON Schema as OpenAPI 3.1 has it. */
  write(schema: AnySchema): JsonSchema {
    const name = this.names.get(schema);
    return name === undefined ? this.describe(schema) : { $ref: `#/components/schemas/${name}` };
  }

  private describe(schema: AnySchema): JsonSchema {
    if (isLazy(schema)) {
      const choice = CHOICES.get(schema);
      if (!choice) throw new Error('A lazy schema is missing from CHOICES in yup-to-json-schema.ts.');
      return { oneOf: choice.schemas.map((one) => this.write(one)) };
    }
    return nullable(schema, this.describeConcrete(schema));
  }

  private describeConcrete(schema: Schema<unknown>): JsonSchema {
    if (schema instanceof ObjectSchema) return this.describeObject(schema);
    if (schema instanceof ArraySchema) {
      const items = schema.innerType ? this.write(schema.innerType as AnySchema) : {};
      return { type: 'array', items, ...lengthBounds(schema, 'Items') };
    }
    if (schema instanceof StringSchema) return describeString(schema);
    if (schema instanceof NumberSchema) return describeNumber(schema);
    if (schema instanceof BooleanSchema) return { type: 'boolean' };
    if (schema instanceof MixedSchema) return describeMixed(schema);
    throw new Error(`No JSON Schema for ${schema.type}.`);
  }

  private describeObject(schema: ObjectSchema<Record<string, unknown>>): JsonSchema {
    const fields: [string, AnySchema][] = Object.entries(schema.fields as Record<string, AnySchema>);
    const required = fields.filter(([, field]) => isRequired(field)).map(([key]) => key);
    return {
      type: 'object',
      additionalProperties: false,
      properties: Object.fromEntries(fields.map(([key, field]) => [key, this.write(field)])),
      ...(required.length > 0 && { required }),
    };
  }
}

function isLazy(schema: AnySchema): schema is Lazy<unknown> {
  return schema.type === 'lazy';
}

function isRequired(field: AnySchema): boolean {
  if (isLazy(field)) return CHOICES.get(field)?.isOptional !== true;
  return !field.spec.optional;
}

function nullable(schema: Schema<unknown>, described: JsonSchema): JsonSchema {
  if (!schema.spec.nullable) return described;
  if (typeof described.type === 'string' && described.enum === undefined)
    return { ...described, type: [described.type, 'null'] };
  return { anyOf: [described, { type: 'null' }] };
}

function describeString(schema: Schema<unknown>): JsonSchema {
  const { oneOf, tests } = described(schema);
  const pattern = tests.find((test) => test.name === 'matches')?.params?.regex;
  const { format } = metaOf(schema);
  const choices = oneOf.filter((value) => typeof value === 'string');
  return {
    type: 'string',
    ...(choices.length > 0 && { enum: choices }),
    ...(typeof format === 'string' && { format }),
    ...(pattern instanceof RegExp && format === undefined && { pattern: pattern.source }),
    ...lengthBounds(schema, 'Length'),
  };
}

function describeNumber(schema: Schema<unknown>): JsonSchema {
  const { tests } = described(schema);
  const { minimum, maximum, isMinExcluded, unit } = metaOf(schema);
  const isInteger = tests.some((test) => test.name === 'integer');
  const bounds = Object.fromEntries(
    tests.flatMap(({ name, params }): [string, unknown][] => {
      if (name === 'min') return [['minimum', params?.min]];
      return name === 'max' ? [['maximum', params?.max]] : [];
    }),
  );
  return {
    type: isInteger ? 'integer' : 'number',
    ...bounds,
    ...(minimum !== undefined && (isMinExcluded === true ? { exclusiveMinimum: minimum } : { minimum })),
    ...(maximum !== undefined && { maximum }),
    ...(typeof unit === 'string' && unit !== '' && { description: `Shown in ${unit}.` }),
  };
}

function describeMixed(schema: Schema<unknown>): JsonSchema {
  if (metaOf(schema).additionalProperties !== 'typed value') return {};
  const typedValue = {
    type: 'object',
    additionalProperties: false,
    properties: { value: { type: 'number' }, unit: { type: 'string', maxLength: 60 } },
    required: ['value', 'unit'],
  };
  return { type: 'object', additionalProperties: typedValue };
}

function lengthBounds(schema: Schema<unknown>, noun: 'Length' | 'Items'): JsonSchema {
  return Object.fromEntries(
    described(schema).tests.flatMap(({ name, params }): [string, unknown][] => {
      if (name === 'min') return [[`min${noun}`, params?.min]];
      if (name === 'max') return [[`max${noun}`, params?.max]];
      return name === 'length'
        ? [
            [`min${noun}`, params?.length],
            [`max${noun}`, params?.length],
          ]
        : [];
    }),
  );
}

interface Described {
  oneOf: unknown[];
  tests: { name?: string; params?: Record<string, unknown> }[];
}

function described(schema: Schema<unknown>): Described {
  const { oneOf, tests } = schema.describe();
  return { oneOf, tests };
}

function metaOf(schema: Schema<unknown>): Record<string, unknown> {
  return schema.describe().meta ?? {};
}
