import { spawnSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import path from 'node:path';
import Ajv2020 from 'ajv/dist/2020';
import request from 'supertest';
import { openApiDocument } from '../../openapi/document';
import { operations } from '../../server/routes';
import { signedIn } from '../support/people';
import { startTestServer, type TestServer } from '../support/server';

const root = path.join(__dirname, '../..');
const committed = readFileSync(path.join(root, 'openapi/openapi.json'), 'utf8');

interface Schema {
  $ref?: string;
  type?: string | string[];
  description?: string;
  example?: unknown;
  pattern?: string;
  properties?: Record<string, Schema>;
  'x-unit'?: string;
}
const document = JSON.parse(committed) as {
  components: { schemas: Record<string, Schema> };
};

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
});
afterAll(() => server.close());

test('the committed document is what the operations say', () => {
  expect(committed).toBe(`${JSON.stringify(openApiDocument(operations), null, 2)}\n`);
});

test('the service serves the committed document', async () => {
  const answer = await request(server.url).get('/openapi.json');
  expect(answer.body).toEqual(document);
});

test('the document is valid OpenAPI 3.1', () => {
  const cli = path.join(root, 'node_modules/@redocly/cli/bin/cli.js');
  const lint = spawnSync(
    process.execPath,
    [cli, 'lint', 'openapi/openapi.json', '--extends=spec', '--format=json'],
    {
      cwd: root,
      encoding: 'utf8',
      env: { ...process.env, REDOCLY_TELEMETRY: 'off', REDOCLY_SUPPRESS_UPDATE_NOTICE: 'true' },
    },
  );
  expect(JSON.parse(lint.stdout)).toMatchObject({ totals: { errors: 0, warnings: 0 } });
});

/** Validates by the document's own JSON Schema, as a caller's tools would. */
const ajv = new Ajv2020({ strict: false, validateFormats: false }).addSchema(document, 'document');
const answerSchema = (path: string, method: string, status: number) => {
  const place = ['paths', path, method, 'responses', `${status}`, 'content', 'application/json'];
  const pointer = place.map((part) => part.replaceAll('~', '~0').replaceAll('/', '~1')).join('/');
  return ajv.compile({ $ref: `document#/${encodeURI(pointer)}/schema` });
};

const examples = operations.flatMap((operation) =>
  Object.entries(operation.examples).map(
    ([name, example]) => [`${operation.operationId} ${name}`, operation, example] as const,
  ),
);

const fill = (path: string, params: Readonly<Record<string, string>> = {}) =>
  path.replace(/\{(\w+)\}/g, (_whole, name: string) => encodeURIComponent(params[name] ?? ''));

test.each(examples)('example %s is what the service answers', async (_name, operation, example) => {
  const { access, method, path, status = 200, answer } = operation;
  const caller =
    typeof access === 'object' && 'roles' in access
      ? await signedIn(server, 'developer@larkmoor.example')
      : request(server.url);
  const call = caller[method](fill(path, example.params)).query(example.query ?? {});
  if (access === 'own-pages') void call.set('Origin', server.url);
  if (typeof access === 'object' && 'scope' in access)
    void call.set('Authorization', `Bearer ${server.key}`);
  const got = example.body === undefined ? await call : await call.send(example.body as object);
  expect(got.status).toBe(status);
  expect(got.body).toEqual(example.answer);
  expect(answer?.safeParse(got.body).error).toBeUndefined();
  const valid = answerSchema(path, method, status);
  valid(got.body);
  expect(valid.errors).toBeNull();
});

const schemaOf = (schema: Schema): Schema =>
  schema.$ref === undefined
    ? schema
    : { ...document.components.schemas[schema.$ref.split('/').pop() ?? ''], ...schema };

const properties = Object.entries(document.components.schemas).flatMap(
  ([name, { properties = {} }]) =>
    Object.entries(properties).map(
      ([key, property]) => [`${name}.${key}`, schemaOf(property)] as const,
    ),
);

test('there are properties to look at', () => {
  expect(properties.length).toBeGreaterThan(50);
});

test.each(properties)('%s is described', (_name, schema) => {
  expect(schema.description).toMatch(/\.$/);
});

const isPlain = ({ type = [] }: Schema) =>
  [type].flat().some((one) => ['string', 'integer', 'number', 'boolean'].includes(one));

test.each(properties.filter(([, schema]) => isPlain(schema)))(
  '%s has an example',
  (_name, schema) => {
    expect(schema.example).toBeDefined();
  },
);

test('every decimal property names its unit', () => {
  const decimal = /^-?\d+(\.\d+)?(e[+-]\d+)?$/;
  const missing = properties.filter(
    ([, { example, 'x-unit': unit }]) =>
      unit === undefined &&
      [example].flat().some((one) => typeof one === 'string' && decimal.test(one)),
  );
  expect(missing.map(([name]) => name)).toEqual(['Model.engineVersion']);
});
