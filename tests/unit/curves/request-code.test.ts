import { spawnSync } from 'node:child_process';
import fc from 'fast-check';
import ts from 'typescript';
import { jsonText } from '../../../components/request/json-text';
import { languages, requestCode } from '../../../components/request/request-code';
import { curveRequest } from '../../../components/curves/curve-request';
import { firstConditions, type CurveConditions } from '../../../components/curves/curve-conditions';
import { screenRequests } from '../../../components/curves/screen-requests';
import { bufferCapacityRequest } from '../../../shared/buffer-capacity';
import { fractionsRequest, publicFractionsRequest } from '../../../shared/fractions';
import { isoelectricPointRequest } from '../../../shared/isoelectric-point';

const url = 'https://stepwell.larkmoor.example/v1/fractions';
const bodyNamed = (name: string) => ({
  system: { name, fullyProtonatedCharge: 0, pKa: ['2.148', '7.198'] },
  pH: { from: '0', to: '14', step: '0.02' },
  digits: 6,
});

const hostile = [
  `O'Neill "buffer" \\ $(touch x) \`id\` $HOME !!`,
  'line one\nline two\ttab\r\u0007\u001b[31m',
  '\u2028\u2029\u202egnirts\ufeff\u200b',
  'pKₐ ′ α é 緩衝液 🧪',
  '\'\'\' """ \\u0041 \\N{BULLET} {curly} %s',
  '\ud83d',
  "'); system('id'); ('",
];
const names = fc.oneof(fc.constantFrom(...hostile), fc.string({ unit: 'binary', maxLength: 40 }));

/** What a POSIX shell hands to the program, told by the shell itself. */
function argumentsOf(command: string): string[] {
  const told = command.replace(/^curl/, "printf '%s\\0'");
  const { stdout, status } = spawnSync('sh', ['-c', told], {
    env: { PATH: process.env.PATH ?? '', STEPWELL_KEY: 'the-key' },
  });
  expect(status).toBe(0);
  return stdout.toString().split('\0').slice(0, -1);
}

describe('the request as curl', () => {
  test.each([...hostile, 'phosphoric acid'])('%j reaches the server as it is', (name) => {
    const body = bodyNamed(name);
    const given = argumentsOf(requestCode.curl({ url, body, result: 'curve' }));
    expect(given.slice(0, -1)).toEqual([
      url,
      '-H',
      'Authorization: Bearer the-key',
      '-H',
      'Content-Type: application/json',
      '-d',
    ]);
    expect(JSON.parse(given.at(-1) ?? '')).toEqual(body);
  });

  test('holds no control character but its line ends', () => {
    fc.assert(
      fc.property(names, (name) => {
        const code = requestCode.curl({ url, body: bodyNamed(name), result: 'curve' });
        expect(code).not.toMatch(/[^\P{Cc}\n]|[\u2028\u2029\u202a-\u202e\ufeff]/u);
      }),
    );
  });
});

describe('the request as TypeScript', () => {
  test('compiles, and its body is the one asked for', () => {
    fc.assert(
      fc.property(names, (name) => {
        const body = bodyNamed(name);
        const code = requestCode.TypeScript({ url, body, result: 'curve' });
        const { diagnostics } = ts.transpileModule(code, {
          reportDiagnostics: true,
          compilerOptions: { module: ts.ModuleKind.ESNext, target: ts.ScriptTarget.ESNext },
        });
        expect(diagnostics).toEqual([]);
        const literal = /JSON\.stringify\(([\s\S]*)\),\n\}\);/.exec(code)?.[1] ?? '';
        expect(new Function(`return ${literal}`)()).toEqual(body);
      }),
    );
  });
});

describe('the request as R', () => {
  test('its string is the JSON of the body, backslashes and quotes escaped', () => {
    fc.assert(
      fc.property(names, (name) => {
        const body = bodyNamed(name);
        const code = requestCode.R({ url, body, result: 'curve' });
        const literal = /req_body_raw\('((?:[^'\\]|\\['\\])*)', type = /.exec(code)?.[1];
        expect(literal).toBeDefined();
        expect(JSON.parse((literal ?? '').replace(/\\(['\\])/g, '$1'))).toEqual(body);
      }),
    );
  });
});

describe('the request as Python', () => {
  test('its literal is plain JSON, which Python reads alike', () => {
    fc.assert(
      fc.property(names, (name) => {
        const body = bodyNamed(name);
        const code = requestCode.Python({ url, body, result: 'curve' });
        const literal = /json\.dumps\(([\s\S]*)\)\.encode\(\)/.exec(code)?.[1] ?? '';
        expect(JSON.parse(literal)).toEqual(body);
      }),
    );
  });

  // A machine without Python still runs the test above.
  const python = spawnSync('python3', ['--version']).status === 0;
  if (python)
    test('runs, and sends the body asked for', () => {
      const program = [
        'import json, os, sys, urllib.request, io',
        'os.environ["STEPWELL_KEY"] = "the-key"',
        'sent = []',
        'def urlopen(request):',
        '    sent.append([request.full_url, request.get_header("Authorization"), request.data.decode()])',
        '    return io.BytesIO(b"{}")',
        'urllib.request.urlopen = urlopen',
        'for code in json.load(sys.stdin):',
        '    exec(compile(code, "request", "exec"), {})',
        'json.dump(sent, sys.stdout)',
      ].join('\n');
      const bodies = hostile.map(bodyNamed);
      const { stdout, stderr } = spawnSync('python3', ['-c', program], {
        input: JSON.stringify(
          bodies.map((body) => requestCode.Python({ url, body, result: 'curve' })),
        ),
      });
      expect(stderr.toString()).toBe('');
      const sent = JSON.parse(stdout.toString()) as [string, string, string][];
      expect(sent.map(([at, header]) => [at, header])).toEqual(
        bodies.map(() => [url, 'Bearer the-key']),
      );
      expect(sent.map(([, , data]) => JSON.parse(data) as unknown)).toEqual(bodies);
    });
});

test('no language writes a key', () => {
  for (const language of languages) {
    const code = requestCode[language]({ url, body: bodyNamed('x'), result: 'curve' });
    expect(code).toContain('STEPWELL_KEY');
    expect(code).not.toContain('stepwell_');
  }
});

describe('the requests of a screen', () => {
  const origin = 'http://127.0.0.1:8080';
  const stored = { kind: 'stored', id: 'edta' } as const;

  test('a curve under the conditions of a first visit says none', () => {
    const byId = curveRequest({ choice: stored, conditions: firstConditions }, origin);
    expect(byId).toEqual({
      url: `${origin}/v1/fractions`,
      body: { system: { id: 'edta' }, pH: { from: '0', to: '14', step: '0.02' }, digits: 6 },
      result: 'curve',
    });
    const system = { name: undefined, fullyProtonatedCharge: 0, pKa: ['0.0', '7.198'] };
    const typed = { choice: { kind: 'typed', system }, conditions: firstConditions } as const;
    const inFull = curveRequest(typed, origin);
    for (const { body } of [byId, inFull]) {
      expect(publicFractionsRequest.safeParse(body).success).toBe(true);
    }
    expect(requestCode.curl(inFull)).toContain('"system": { "fullyProtonatedCharge": 0,');
  });

  test('conditions are in every call that the layers are made of, and fit the contract', () => {
    const conditions: CurveConditions = {
      temperature: '37',
      ionicStrength: '0.15',
      activityModel: 'davies',
      outOfRange: 'compute',
    };
    const asked = { choice: stored, conditions };
    const shown = ['fractions', 'capacity', 'isoelectric-point'] as const;
    const grid = { from: '0', to: '14', step: '0.02' };
    const requests = screenRequests({ asked, total: '0.05', shown, grid }, origin);
    expect(requests.map(({ request }) => new URL(request.url).pathname)).toEqual([
      '/v1/fractions',
      '/v1/buffer-capacity',
      '/v1/isoelectric-point',
    ]);
    const [fractions, capacity, point] = requests.map(({ request }) => request.body);
    expect(fractionsRequest.safeParse(fractions).success).toBe(true);
    expect(bufferCapacityRequest.safeParse(capacity).success).toBe(true);
    expect(isoelectricPointRequest.safeParse(point).success).toBe(true);
    for (const body of [fractions, capacity, point]) expect(body).toMatchObject({ conditions });
  });
});

test('a list of objects has a line for each', () => {
  const component = (id: string) => ({ system: { id }, concentration: '0.025' });
  const body = { components: [component('tris'), component('glycine')], pH: ['7', '8'] };
  expect(jsonText(body)).toBe(
    [
      '{',
      '  "components": [',
      '    { "system": { "id": "tris" }, "concentration": "0.025" },',
      '    { "system": { "id": "glycine" }, "concentration": "0.025" }',
      '  ],',
      '  "pH": ["7", "8"]',
      '}',
    ].join('\n'),
  );
});
