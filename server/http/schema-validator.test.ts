import { describe, expect, it } from 'vitest';
import { ROUTES } from '#server/http/routes.ts';
import { createRouteChecks } from '#server/http/request-context.ts';
import { createReplyCheck } from '#server/http/reply-check.ts';
import { createValidator, readApiSchemas } from '#server/http/schema-validator.ts';

const validator = createValidator(readApiSchemas());

describe('validator', () => {
  const check = validator.body({
    type: 'object',
    properties: { 'a/b': { type: 'integer' }, kind: { enum: ['x', 'y'] } },
    required: ['kind'],
    additionalProperties: false,
  });

  it('finds every fault of a small body, each with its pointer', () => {
    expect(check({ 'a/b': 'one', other: 1 }, 10)).toEqual([
      { pointer: '/kind', code: 'required', detail: 'This is missing.' },
      { pointer: '/other', code: 'additionalProperties', detail: 'This name is not known here.' },
      { pointer: '/a~1b', code: 'type', detail: 'Write a whole number.' },
    ]);
  });

  it.each([
    [{ type: 'string', format: 'email' }, 'no address', 'Write an e-mail address, as name@company.example.'],
    [{ type: 'string', minLength: 1 }, '', 'This is blank. Write something.'],
    [{ type: 'string', pattern: '\\S' }, '  ', 'This is blank. Write something.'],
    [{ type: 'string', maxLength: 3 }, 'four', 'This is too long: at most 3 characters.'],
    [{ type: 'number', minimum: 2 }, 1, 'This must be at least 2.'],
    [{ type: 'number', exclusiveMinimum: 0 }, 0, 'This must be more than 0.'],
  ])('says what to write: %j', (schema, value, detail) => {
    expect(validator.body(schema)(value, 10)).toMatchObject([{ detail }]);
  });

  it('stops at the first fault of a large body', () => {
    expect(check({ 'a/b': 'one', other: 1 }, 1_000_000)).toHaveLength(1);
  });

  it('never turns text of a body into a number, but does so in an address', () => {
    const schema = { type: 'object', properties: { n: { type: 'integer' } } };
    expect(validator.body(schema)({ n: '5' }, 10)).toHaveLength(1);
    const query = { n: '5' };
    expect(validator.parameters(schema)(query)).toEqual([]);
    expect(query).toEqual({ n: 5 });
  });
});

describe('route table', () => {
  it('has schemas that compile', () => {
    const compile = () => {
      for (const route of ROUTES) {
        createRouteChecks(route, validator)();
        createReplyCheck(route, validator)?.(undefined);
        if (route.reply) validator.body(route.reply);
      }
    };
    expect(compile).not.toThrow();
  });

  it('names each method and path once', () => {
    const names = ROUTES.map(({ method, path }) => `${method} ${path.replaceAll(/:\w+/g, ':')}`);
    expect(names.filter((name, index) => names.indexOf(name) !== index)).toEqual([]);
  });
});
