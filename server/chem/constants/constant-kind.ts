/** What activities and concentrations a constant is written in. */
export type ConstantKind = 'thermodynamic' | 'mixed' | 'concentration';
