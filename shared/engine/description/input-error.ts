/**
 * Thrown for input that cannot be computed with; the only exception the engine throws on purpose.
 * `path` names the field in the description, `value` is what was given, `message` says why not and what would do.
 */
export class InputError extends Error {
  readonly path: string;
  readonly value: unknown;

  constructor(path: string, value: unknown, message: string) {
    super(message);
    this.name = 'InputError';
    this.path = path;
    this.value = value;
  }
}
