import type { ActivityModel } from '../../shared/conditions';
import type { Choice } from '../constants/choice';
import type { ElectrolyteName } from './electrolytes';

/** An acid or base as it was weighed in. */
export interface WeighedPart {
  readonly choice: Choice;
  /** Protons lost of the form weighed in; undefined for the uncharged one. */
  readonly form?: number | undefined;
  /** Canonical name of the ion weighed in with a charged form; undefined for Na⁺ or Cl⁻. */
  readonly counterIon?: string | undefined;
  /** mol/L. */
  readonly concentration: string;
}

/** A salt, strong acid or strong base by name. */
export interface ElectrolytePart {
  readonly name: ElectrolyteName;
  /** mol/L. */
  readonly concentration: string;
}

/** Everything that makes the Mixture screen what it is; the address carries it. */
export interface MixtureState {
  readonly parts: readonly WeighedPart[];
  /** mol/L; 0 for none. */
  readonly strongAcid: string;
  readonly strongBase: string;
  readonly electrolytes: readonly ElectrolytePart[];
  /** Partial pressure of carbon dioxide, Pa; undefined for a closed flask. */
  readonly air: string | undefined;
  /** °C. */
  readonly temperature: string;
  readonly model: ActivityModel;
  /** mol/L; undefined for that of the ions themselves. */
  readonly ionicStrength: string | undefined;
  /** Compute beyond the range of the model and of the constants too. */
  readonly beyond: boolean;
}

/** Water alone. */
export const emptyFlask: MixtureState = {
  parts: [],
  strongAcid: '0',
  strongBase: '0',
  electrolytes: [],
  air: undefined,
  temperature: '25',
  model: 'davies',
  ionicStrength: undefined,
  beyond: false,
};

const phosphate = { kind: 'stored', id: 'phosphoric-acid' } as const;

/** What a first visit shows: the equimolal phosphate buffer that meters are calibrated with. */
export const firstState: MixtureState = {
  ...emptyFlask,
  parts: [
    { choice: phosphate, form: 1, counterIon: 'K^+', concentration: '0.025' },
    { choice: phosphate, form: 2, concentration: '0.025' },
  ],
};

/** Carbon dioxide in today’s air, Pa: about 420 ppm, 0.00042 atm of 101325 Pa. */
export const airOfToday = '42.5565';

/** What a new component begins with, mol/L. */
export const firstConcentration = '0.010';
