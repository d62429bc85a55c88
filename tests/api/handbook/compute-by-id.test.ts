import request from 'supertest';
import { fractionsAnswer } from '../../../shared/fractions';
import { handbook } from '../../../server/database/handbook/handbook';
import { seedHandbook } from '../../../server/database/seed-handbook';
import { demoKey, demoOrganizations } from '../../../server/services/demo/demo-data';
import { faultsIn, phosphoric, postWithKey } from '../../support/calls';
import { insertOwnSystem } from '../../support/own-system';
import { startTestServer, type TestServer } from '../../support/server';

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
  await insertOwnSystem(server.database, demoOrganizations[0].id, 'bench-buffer-k3x7q2');
});
afterAll(() => server.close());

const ask = (body: object) => postWithKey(server, '/v1/fractions').send(body);
const get = (path: string) =>
  request(server.url).get(path).set('Authorization', `Bearer ${server.key}`);
const warningsOf = async (id: string) => {
  const { body } = await ask({ system: { id }, pH: '7', digits: 3 });
  return fractionsAnswer
    .parse(body)
    .model.warnings.map(({ code, message, pointer }) => [code, pointer, message]);
};

test('a system by its id is computed with its preferred constants, formulas beside the species', async () => {
  const byId = await ask({ system: { id: 'phosphoric-acid' }, pH: '7.4', digits: 10 });
  const inFull = await ask({ system: phosphoric, pH: '7.4', digits: 10 });
  const answer = fractionsAnswer.parse(byId.body);
  expect(answer.points).toEqual(inFull.body.points);
  expect(answer.predominance).toEqual(inFull.body.predominance);
  expect(answer.name).toBe('phosphoric acid');
  expect(answer.species).toEqual([
    { index: 0, charge: 0, protonsLost: 0, formula: 'H3PO4' },
    { index: 1, charge: -1, protonsLost: 1, formula: 'H2PO4^-' },
    { index: 2, charge: -2, protonsLost: 2, formula: 'HPO4^2-' },
    { index: 3, charge: -3, protonsLost: 3, formula: 'PO4^3-' },
  ]);
});

test('the model says which revision was used and what is known of each constant', async () => {
  const { body } = await ask({ system: { id: 'phosphoric-acid' }, pH: '7' });
  const { constantsUsed, warnings } = fractionsAnswer.parse(body).model;
  expect(warnings).toEqual([]);
  expect(constantsUsed).toHaveLength(1);
  expect(constantsUsed[0]).toMatchObject({
    name: 'phosphoric acid',
    system: { id: 'phosphoric-acid', revision: 1 },
    fullyProtonatedCharge: 0,
    pKa: ['2.148', '7.198', '12.35'],
    constants: [
      { step: 1, value: '2.148', deltaH: '-8.0', deltaCp: '-141.0', provenance: 'recalled' },
      { step: 2, value: '7.198', kind: 'thermodynamic', temperature: '25', ionicStrength: '0' },
      { step: 3, value: '12.35' },
    ],
  });
  expect(constantsUsed[0]?.constants?.[0]?.source).toMatch(/31, 231 \(2002\)/);
  expect(constantsUsed[0]?.kind).toBeUndefined();
});

test('systems by id and in full stand together, in the order asked', async () => {
  const systems = [{ id: 'tris' }, { name: 'mine', ...phosphoric }, { id: 'tris@1' }];
  const { body } = await ask({ systems, pH: '8', digits: 4 });
  expect(body.items.map(({ name }: { name: string }) => name)).toEqual(['tris', 'mine', 'tris']);
  expect(body.items[2]).toEqual(body.items[0]);
  expect(body.items[1].species[0].formula).toBeUndefined();
});

test('a hundred systems by id are answered at once', async () => {
  const ids = handbook()
    .slice(0, 100)
    .map(({ id }) => id);
  const { body } = await ask({ systems: ids.map((id) => ({ id })), pH: '7', digits: 2 });
  const used = body.model.constantsUsed.map(({ system }: { system: { id: string } }) => system.id);
  expect(used).toEqual(ids);
});

test('every entry of the handbook computes, and its fractions add up to 1', async () => {
  const ids = handbook().map(({ id }) => id);
  for (let from = 0; from < ids.length; from += 100) {
    const systems = ids.slice(from, from + 100).map((id) => ({ id }));
    const { body, status } = await ask({ systems, pH: '7', digits: 30 });
    expect(status).toBe(200);
    for (const { name, points } of body.items) {
      const sum = points[0].fractions.reduce((all: number, one: string) => all + Number(one), 0);
      expect([name, Math.abs(sum - 1) < 1e-12]).toEqual([name, true]);
    }
  }
});

describe('warnings', () => {
  test('name an estimate of a strong acid', async () => {
    expect(await warningsOf('hydrochloric-acid')).toEqual([
      [
        'estimated-constant',
        '/system/id',
        'hydrochloric acid, pKa 1 (-6.0): an estimate, not a measurement.',
      ],
    ]);
  });

  test('name constants that hold in a medium of their own', async () => {
    expect(await warningsOf('egta')).toEqual([
      [
        'constants-at-their-medium',
        '/system/id',
        'EGTA, pKa 1 (2.0), pKa 2 (2.66), pKa 3 (8.85), pKa 4 (9.46): used as given, for an ionic strength of 0.1 mol/L.',
      ],
    ]);
    const [[, , message] = []] = await warningsOf('edta');
    expect(message).toMatch(/for an ionic strength of 1 mol\/L and 0\.1 mol\/L\.$/);
  });

  test('name constants of another temperature, that step alone', async () => {
    expect(await warningsOf('hydrogen-telluride')).toEqual([
      [
        'pka-not-temperature-corrected',
        '/system/id',
        'hydrogen telluride, pKa 1 (2.6): used as given, determined at 18 °C.',
      ],
    ]);
  });

  test('come with an organization’s own constants, and with a dry run', async () => {
    const codes = ['constants-at-their-medium', 'pka-not-temperature-corrected'];
    const id = 'bench-buffer-k3x7q2';
    expect((await warningsOf(id)).map(([code]) => code)).toEqual(codes);
    const { body } = await ask({ systems: [phosphoric, { id }], pH: '7', dryRun: true });
    expect(body.warnings.map(({ pointer }: { pointer: string }) => pointer)).toEqual(
      codes.map(() => '/systems/1/id'),
    );
  });
});

test('an unknown system is a 400 that points at its id', async () => {
  const wrong: [object, string][] = [
    [{ system: { id: 'no-such' }, pH: '7' }, '/system/id unknown-system'],
    [{ system: { id: 'tris@7' }, pH: '7' }, '/system/id unknown-system'],
    [{ systems: [phosphoric, { id: 'no-such' }], pH: '7' }, '/systems/1/id unknown-system'],
    [{ system: { id: 'Tris' }, pH: '7' }, '/system/id invalid-value'],
    [{ system: { id: 'tris@0' }, pH: '7' }, '/system/id invalid-value'],
    [{ system: { id: 'x'.repeat(91) }, pH: '7' }, '/system/id out-of-range'],
    [{ system: { id: 7 }, pH: '7' }, '/system/id wrong-type'],
    [{ system: { id: 'tris', pKa: ['7'] }, pH: '7' }, '/system/pKa unknown-field'],
    [{ system: {}, pH: '7' }, '/system/id missing'],
    [{ system: 'tris', pH: '7' }, '/system invalid-value'],
  ];
  for (const [body, fault] of wrong) {
    const answer = await ask(body);
    expect([fault, answer.status, faultsIn(answer.body)]).toEqual([fault, 400, [fault]]);
  }
});

test('cost counts the protons of the system that is named', async () => {
  const pH = { from: '0', to: '14', step: '0.01' };
  const { body } = await ask({ system: { id: 'edta' }, pH, digits: 34, dryRun: true });
  expect(body.cost).toBe(1401 * 7 * 54);
  const openly = await request(server.url)
    .post('/v1/public/fractions')
    .send({ system: { id: 'edta' }, pH: { ...pH, step: '0.005' }, digits: 60 });
  expect([openly.status, openly.body.errors[0].code]).toEqual([422, 'cost-over-limit']);
});

test('a pinned revision goes on being computed with', async () => {
  const changed = handbook().map((entry) =>
    entry.id === 'mes' ? { ...entry, note: 'looked at again' } : entry,
  );
  await seedHandbook(server.database, changed);
  const revisionOf = async (id: string) => {
    const { body } = await ask({ system: { id }, pH: '6' });
    return body.model.constantsUsed[0].system.revision as number;
  };
  expect(await revisionOf('mes')).toBe(2);
  expect(await revisionOf('mes@1')).toBe(1);
});

describe('the one-line form', () => {
  test('gives the same bytes as the call it stands for', async () => {
    const line = await get('/v1/systems/citric-acid/fractions?pH=5.0&digits=12');
    const call = await ask({ system: { id: 'citric-acid' }, pH: '5.0', digits: 12 });
    expect(line.status).toBe(200);
    expect(line.text).toBe(call.text);
    const short = await get('/v1/systems/citric-acid/fractions?pH=5.0');
    expect(short.body.model.digits).toBe(16);
  });

  test('answers as CSV too', async () => {
    const answer = await get('/v1/systems/tris/fractions?pH=8.072&digits=3').set(
      'Accept',
      'text/csv',
    );
    expect(answer.text.split('\r\n')[1]).toBe('0,8.072,0.500,0.500,1.00,0.500,0');
  });

  test.each([
    ['', '?pH missing'],
    ['?pH=41', '?pH out-of-range'],
    ['?pH=7,4', '?pH not-a-decimal'],
    ['?pH=7&digits=61', '?digits out-of-range'],
    ['?pH=7&digits=few', '?digits wrong-type'],
    ['?pH=7&dryRun=true', '?dryRun unknown-field'],
  ])('%s is a 400 that names the parameter', async (query, fault) => {
    const { status, body } = await get(`/v1/systems/tris/fractions${query}`);
    expect([status, faultsIn(body)]).toEqual([400, [fault]]);
  });

  test('of no system is a 404', async () => {
    expect((await get('/v1/systems/no-such/fractions?pH=7')).status).toBe(404);
  });

  test('needs the scope compute, as reading needs systems:read', async () => {
    const { key } = await server.services.keyConsole.issue(demoKey.issuer, {
      name: 'reader',
      scopes: ['systems:read'],
      expiresInDays: 1,
    });
    const as = (path: string) =>
      request(server.url).get(path).set('Authorization', `Bearer ${key}`);
    expect((await as('/v1/systems/tris/fractions?pH=7')).status).toBe(403);
    expect((await as('/v1/systems/tris')).status).toBe(200);
  });
});

test('without a key a stored system is computed on the public path', async () => {
  const answer = await request(server.url)
    .post('/v1/public/fractions')
    .send({ system: { id: 'tris' }, pH: '8.072', digits: 3 });
  expect(answer.body.points[0].fractions).toEqual(['0.500', '0.500']);
  expect(answer.body.species[0].formula).toBe('C4H12NO3^+');
});
