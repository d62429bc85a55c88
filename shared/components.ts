import { z } from 'zod';
import { decimalWithin } from './decimal';
import { ionInput } from './ion';
import { limits } from './limits';
import { quantity } from './quantity';
import { systemInput } from './system';

/** A concentration, mol/L, or mol/kg where the conditions’ basis says so. */
export const concentration = quantity('concentration', limits.concentration).meta({
  id: 'Concentration',
  description: 'Amount concentration: "0.025" or "25 mmol/L".',
  example: '0.025',
  'x-unit': 'mol/L',
});

/** The species that was weighed in: protons lost from the fully protonated one, or its charge. */
export const form = z
  .union(
    [
      z.int().min(0).max(limits.protons),
      z.strictObject({
        charge: z.int().min(-200).max(200).meta({
          description: 'Charge number of the species weighed in.',
          example: -1,
          'x-unit': 'e',
        }),
      }),
    ],
    { error: 'Write the protons lost as a whole number, such as 1, or { "charge": -1 }.' },
  )
  .meta({
    id: 'Form',
    description:
      'The species weighed in: protons lost from the fully protonated one, or `{ "charge": -1 }`.',
    example: 1,
  });

/** A component weighed in: its total is fixed. */
export const weighedComponent = z
  .strictObject({
    system: systemInput,
    concentration,
    form,
    counterIon: ionInput.optional().meta({
      description:
        'Ion that was weighed in with a charged form; Na⁺ or Cl⁻ where left out. It takes no part, and counts in the ionic strength.',
      example: 'K+',
    }),
  })
  .meta({
    id: 'WeighedComponent',
    description: 'A component as it is weighed in: KH2PO4 is phosphoric acid, form 1, with K+.',
  });

/** A component that a gas phase holds: its neutral species is fixed. */
export const heldComponent = z
  .strictObject({
    system: systemInput,
    heldBy: z
      .strictObject({
        partialPressure: quantity('pressure', limits.pressure).meta({
          description: 'Partial pressure in the gas: "40" or "0.0004 atm".',
          example: '0.0004 atm',
          'x-unit': 'Pa',
        }),
        henryConstant: decimalWithin({ from: '1e-12', to: '1e6', decimals: 40 }).optional().meta({
          description:
            'Solubility of the neutral species at this temperature; known for carbon dioxide (carbonic-acid), needed for others.',
          example: '0.0340',
          'x-unit': 'mol/(kg atm)',
        }),
      })
      .meta({ id: 'HeldBy', description: 'The gas phase that holds the component.' }),
  })
  .meta({
    id: 'HeldComponent',
    description: 'A component open to a gas phase: its neutral species is fixed, not its total.',
  });

export const component = z
  .union([weighedComponent, heldComponent])
  .meta({ id: 'Component', description: 'A component, weighed in or held by a gas phase.' });
