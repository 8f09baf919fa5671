import type { Route } from '#server/http/define-route.ts';
import type { Validator } from '#server/http/schema-validator.ts';

export type ReplyCheck = (reply: unknown) => void;

/**
 * Compares every reply with the schema that the OpenAPI document promises. On in tests, where a reply that drifts
 * from its schema must fail; off in service, where it would turn a good answer into an error.
 */
export function createReplyCheck(route: Route, validator: Validator): ReplyCheck | null {
  const { reply: schema } = route;
  if (!schema) return null;
  let check: ReturnType<Validator['body']> | null = null;
  return (reply) => {
    if (reply === undefined) return;
    check ??= validator.body(schema);
    const errors = check(JSON.parse(JSON.stringify(reply)), 0);
    if (errors.length === 0) return;
    const faults = errors.map((error) => `${error.pointer}: ${error.detail}`).join('; ');
    throw new Error(
      `${route.method.toUpperCase()} ${route.path} answers what its schema does not allow: ${faults}`,
    );
  };
}
