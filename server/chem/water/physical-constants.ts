/**
 * CODATA 2018, SI units. The first three define the SI since 2019 and are exact. The electric
 * constant is measured, to 1.5 parts in 10¹⁰; its recommended value is taken as exact.
 */
export const elementaryCharge = '1.602176634e-19';
export const boltzmannConstant = '1.380649e-23';
export const avogadroConstant = '6.02214076e23';
export const electricConstant = '8.8541878128e-12';

/** R in J/(K mol): CODATA 2018 as printed, the exact N_A k cut after ten digits. */
export const gasConstant = '8.314462618';
