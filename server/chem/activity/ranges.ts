/** The models of activity coefficients. */
export type ActivityModel =
  | 'ideal'
  | 'debye-huckel'
  | 'extended-debye-huckel'
  | 'guntelberg'
  | 'davies'
  | 'specific-ion-interaction'
  | 'pitzer';

/**
 * Ionic strengths usually quoted as the end of each model's range. Davies: C. W. Davies, Ion
 * Association (1962). Specific ion interaction: its coefficients come from media up to about
 * 3.5 mol/kg, but with many of them unknown it is trusted to 1. Recalled.
 */
const limits: Readonly<Record<ActivityModel, string | undefined>> = {
  ideal: undefined,
  'debye-huckel': '0.005',
  'extended-debye-huckel': '0.1',
  guntelberg: '0.1',
  davies: '0.5',
  'specific-ion-interaction': '1',
  pitzer: '6',
};

/**
 * The ionic strength up to which a model is good, mol/L, or mol/kg for the two by interactions;
 * undefined for the ideal model, which claims nothing. Beyond it an answer carries a warning, and
 * beyond twice it is refused unless it was asked for all the same.
 */
export const usableTo = (model: ActivityModel): string | undefined => limits[model];

/** The largest charge number, of either sign, that a model other than the ideal one is asked about. */
export const largestCharge = 6;
