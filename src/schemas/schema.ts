import * as z from './zod';

/** The one zod type other layers need: they pass schemas on, they do not make them. */
export type Schema = z.ZodType;
export type Parsed<S extends Schema> = z.output<S>;
export type Unparsed<S extends Schema> = z.input<S>;

/**
 * The JSON Schema (2020-12, as OpenAPI 3.1 uses) of the JSON a schema parses: of requests, and of
 * responses too, whose branded quantities are plain numbers on the wire.
 */
export function jsonSchemaOf(schema: Schema): Record<string, unknown> {
  const { $schema: _dialect, ...rest } = z.toJSONSchema(schema, {
    io: 'input',
    target: 'draft-2020-12',
    unrepresentable: 'any',
  });
  return rest;
}

/** First message of each failing field, keyed by its path: `plan.yarn.putUp.massG`. */
export function fieldErrors(error: z.ZodError): Record<string, string> {
  const fields: Record<string, string> = {};
  for (const issue of error.issues) {
    const path = issue.path.join('.');
    fields[path] ??= issue.message;
  }
  return fields;
}

/** The response of a route that answers 204. */
export const nothingSchema = z.void();

/** A schema whose fields keep their types when parsed, as a form's must. */
export type FormSchema<Values> = z.ZodType<Values, Values>;
