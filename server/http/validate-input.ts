import { ValidationError, type AnyObjectSchema, type Schema } from 'yup';
import type { FieldFault } from '../../shared/errors/error-code';
import { inputInvalid } from './app-error';
import { findUnkeepable } from './input-limits';

const MOST_FAULTS = 50;
const LONGEST_SHOWN_TEXT = 200;

/** The body as its contract describes it; throws input_invalid with every faulty field otherwise. */
export function validateBody<Body>(schema: Schema<Body>, body: unknown): Body {
  const unkeepable = findUnkeepable(body);
  if (unkeepable !== undefined) throw inputInvalid([unkeepable]);
  if (typeof body !== 'object' || body === null || Array.isArray(body)) {
    throw inputInvalid([
      { path: '', message: 'Send a JSON object, with the header Content-Type: application/json.' },
    ]);
  }
  return validate(schema, body, { isStrict: true });
}

/** The query as its contract describes it; numbers arrive as text and are read, so yup would drop unknown keys. */
export function validateQuery(schema: AnyObjectSchema, query: object) {
  const unknown = Object.keys(query).filter((key) => !Object.hasOwn(schema.fields, key));
  if (unknown.length > 0) {
    throw inputInvalid(unknown.map((path) => ({ path, message: `Unknown parameter: ${path}. Remove it.` })));
  }
  return validate(schema, query, { isStrict: false });
}

function validate<Value>(schema: Schema<Value>, value: unknown, { isStrict }: { isStrict: boolean }): Value {
  try {
    return schema.validateSync(value, { strict: isStrict, abortEarly: false });
  } catch (error) {
    if (error instanceof ValidationError) throw inputInvalid(faultsOf(error));
    throw error;
  }
}

function faultsOf(error: ValidationError): FieldFault[] {
  const single = error.inner.length > 0 ? error.inner : [error];
  // The outer first: "at most 50 layers" must not drown in the faults of the layers.
  const outerFirst = single
    .flatMap(faultsOfOne)
    .sort((one, other) => depthOf(one.path) - depthOf(other.path));
  return outerFirst.slice(0, MOST_FAULTS);
}

function depthOf(path: string): number {
  return path.split(/[.[]/).length;
}

function faultsOfOne(error: ValidationError): FieldFault[] {
  const path = error.path ?? '';
  const message = error.errors[0] ?? error.message;
  const unknownKeys = error.type === 'noUnknown' ? error.params?.unknown : undefined;
  if (typeof unknownKeys === 'string') {
    return unknownKeys.split(', ').map((key) => ({ path: path === '' ? key : `${path}.${key}`, message }));
  }
  return [
    {
      path,
      value: shownValue(error.params?.originalValue),
      message: isYupsOwn(message) ? kindWanted(error) : message,
    },
  ];
}

/** Said by yup where the contract says nothing of its own: an object, a list or a text in the wrong place. */
function isYupsOwn(message: string): boolean {
  return message.includes(' type, but the final value was: ');
}

const WORDS_BY_TYPE: Readonly<Record<string, string>> = {
  object: 'an object',
  array: 'a list',
  string: 'text',
  number: 'a number',
  boolean: 'true or false',
};

function kindWanted(error: ValidationError): string {
  return `Send ${WORDS_BY_TYPE[String(error.params?.type)] ?? 'another kind of value'} here.`;
}

/** What was given, as far as it can be said in a line. */
function shownValue(value: unknown): unknown {
  if (typeof value === 'string') return value.slice(0, LONGEST_SHOWN_TEXT);
  if (typeof value === 'number') return Number.isFinite(value) ? value : String(value);
  return typeof value === 'boolean' || value === null ? value : undefined;
}
