import type { KnownSystem } from '../../../components/mixture/known-system';
import { placeFaults } from '../../../components/mixture/faults';
import {
  mixtureAsked,
  systemsIn,
  withTrialAcid,
  type SystemOf,
} from '../../../components/mixture/mixture-request';
import {
  emptyFlask,
  firstState,
  type MixtureState,
} from '../../../components/mixture/mixture-state';
import { ProblemError } from '../../../shared/client';
import { publicMixtureRequest } from '../../../shared/mixtures';

const phosphoric: KnownSystem = {
  title: 'Phosphoric acid',
  fullyProtonatedCharge: 0,
  formulas: ['H3PO4', 'H2PO4^-', 'HPO4^2-', 'PO4^3-'],
};
const tris: KnownSystem = {
  title: 'Tris',
  fullyProtonatedCharge: 1,
  formulas: ['C4H12NO3^+', 'C4H11NO3'],
};
const known: SystemOf = (choice) =>
  choice.kind === 'stored' && choice.id === 'tris' ? tris : phosphoric;
const unknown: SystemOf = () => undefined;

const flask = (part: Partial<MixtureState>): MixtureState => ({ ...emptyFlask, ...part });
const stored = (id: string) => ({ kind: 'stored', id }) as const;
const conditions = {
  temperature: '25',
  activityModel: 'davies',
  ionicStrength: 'self-consistent',
};

describe('the call of a mixture', () => {
  test('asks for the first visit without waiting for the handbook', () => {
    const phosphate = { system: { id: 'phosphoric-acid' }, concentration: '0.025' };
    const body = {
      components: [
        { ...phosphate, form: 1, counterIon: 'K^+' },
        { ...phosphate, form: 2 },
      ],
      conditions,
    };
    expect(mixtureAsked(firstState, unknown)?.body).toEqual(body);
    expect(mixtureAsked(firstState, known)?.body).toEqual(body);
  });

  test('weighs in the uncharged form where none is said, once it is known which that is', () => {
    const state = flask({ parts: [{ choice: stored('tris'), concentration: '0.1' }] });
    expect(mixtureAsked(state, unknown)).toBeUndefined();
    expect(mixtureAsked(state, known)?.body.components).toEqual([
      { system: { id: 'tris' }, concentration: '0.1', form: 1 },
    ]);
  });

  test('takes an ammonium salt for what it is made of: (NH4)2HPO4 is H3PO4 and 2 NH3', () => {
    const part = { choice: stored('phosphoric-acid'), form: 2, concentration: '0.05' };
    const asked = mixtureAsked(flask({ parts: [{ ...part, counterIon: 'NH4^+' }] }), known);
    expect(asked?.body.components).toEqual([
      { system: { id: 'phosphoric-acid' }, concentration: '0.05', form: 0 },
      { system: { id: 'ammonia' }, concentration: '0.1', form: 1 },
    ]);
    expect(asked?.components).toEqual([0, 0]);
  });

  test.each([0, 1])(
    'leaves out chloride with form %i of an acid, which has no use for it',
    (form) => {
      const part = { choice: stored('phosphoric-acid'), form, concentration: '0.05' };
      const asked = mixtureAsked(flask({ parts: [{ ...part, counterIon: 'Cl^-' }] }), known);
      expect(asked?.body.components).toEqual([
        { system: { id: 'phosphoric-acid' }, concentration: '0.05', form },
      ]);
    },
  );

  test('names the ions of salts, the pairs of calcium, the air over the flask', () => {
    const asked = mixtureAsked(
      flask({
        strongAcid: '0.01',
        electrolytes: [
          { name: 'MgCl2', concentration: '0.05' },
          { name: 'Ca(OH)2', concentration: '0.02' },
        ],
        air: '42.5565',
      }),
      known,
    );
    expect(asked?.body).toEqual({
      components: [{ system: { id: 'carbonic-acid' }, heldBy: { partialPressure: '42.5565' } }],
      strongAcid: '0.01',
      ions: [
        { charge: 2, concentration: '0.05', ion: 'Mg^2+' },
        { charge: -1, concentration: '0.1', ion: 'Cl^-' },
        { charge: 2, concentration: '0.02', ion: 'Ca^2+' },
      ],
      ionPairs: [{ ion: 'Ca^2+' }],
      conditions,
    });
    expect(asked?.components).toEqual(['air']);
    expect(asked?.ions).toEqual([0, 0, 1]);
    expect(publicMixtureRequest.safeParse(asked?.body).error).toBeUndefined();
  });

  test('says conditions that were given', () => {
    const state = flask({ model: 'pitzer', ionicStrength: '0.5', beyond: true, temperature: '5' });
    expect(mixtureAsked(state, known)?.body).toEqual({
      components: [],
      conditions: {
        temperature: '5',
        activityModel: 'pitzer',
        ionicStrength: '0.5',
        outOfRange: 'compute',
      },
    });
  });

  test('is tried with 5 mmol/L of strong acid more', () => {
    expect(withTrialAcid({ components: [] }).strongAcid).toBe('0.005');
    expect(withTrialAcid({ components: [], strongAcid: '0.01' }).strongAcid).toBe('0.015');
  });

  test('knows a system that was weighed in as several forms for one', () => {
    const { body } = mixtureAsked({ ...firstState, air: '42.5565' }, known) ?? {};
    expect(body && systemsIn(body)).toEqual([[0, 1]]);
  });
});

test('a fault that the service found stands beside what it is about', () => {
  const part = { choice: stored('phosphoric-acid'), form: 1, concentration: '0.05' };
  const asked = mixtureAsked(
    flask({
      parts: [{ ...part, counterIon: 'NH4^+' }, part],
      electrolytes: [{ name: 'NaCl', concentration: '0.1' }],
    }),
    known,
  );
  const fault = (pointer: string) => ({ pointer, code: 'out-of-range', detail: pointer });
  const faults = placeFaults(
    new ProblemError({
      type: 'about:blank',
      title: 'The request does not fit the contract',
      status: 400,
      requestId: '',
      errors: [
        '/components/2/concentration',
        '/ions/1',
        '/strongBase',
        '/conditions/temperature',
      ].map(fault),
    }),
    asked,
  );
  expect([...faults.parts]).toEqual([[1, '/components/2/concentration']]);
  expect([...faults.electrolytes]).toEqual([[0, '/ions/1']]);
  expect(faults.strongBase).toBe('/strongBase');
  expect(faults.strongAcid).toBeUndefined();
  expect(faults.conditions.at.temperature).toBe('/conditions/temperature');
  expect(faults.allPlaced).toBe(true);
});
