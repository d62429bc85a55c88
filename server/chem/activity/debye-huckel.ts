import type { Arithmetic } from '../decimals/arithmetic';

/** The models in which an ion's coefficient depends on I, its charge and perhaps its size alone. */
export type DebyeHuckelModel = 'debye-huckel' | 'guntelberg' | 'davies' | 'extended-debye-huckel';

/** What the models are made of; each takes what it needs. */
export interface DebyeHuckelParameters<N> {
  /** (kg/mol)^½, for lg. */
  readonly A: N;
  /** The coefficient of I in Davies's equation: 0.3 (1962), once 0.2 (1938). */
  readonly linear: N;
  /** (kg/mol)^½ nm⁻¹. */
  readonly B: N;
  /** The ion's size å, pm. */
  readonly size: N;
}

/**
 * F of lg γ = −z² F at an ionic strength I ≥ 0:
 *
 *     debye-huckel            A √I                        P. Debye & E. Hückel 1923, limiting law
 *     extended-debye-huckel   A √I/(1 + B å √I)           the same, with ion sizes
 *     guntelberg              A √I/(1 + √I)               E. Güntelberg 1926
 *     davies                  A (√I/(1 + √I) − linear I)  C. W. Davies 1938, 1962
 *
 * Only Davies's F ever falls below 0, and γ rises above 1: with 0.3 from I = 1.95 on.
 */
export function debyeHuckelTerm<N>(
  arithmetic: Arithmetic<N>,
  model: DebyeHuckelModel,
  ionicStrength: N,
  { A, linear, B, size }: DebyeHuckelParameters<N>,
): N {
  const { of, plus, minus, times, over, sqrt } = arithmetic;
  const root = sqrt(ionicStrength);
  /** √I/(1 + closeness √I). */
  const damped = (closeness: N) => over(root, plus(of(1), times(closeness, root)));
  const shape = (): N => {
    switch (model) {
      case 'debye-huckel':
        return root;
      case 'guntelberg':
        return damped(of(1));
      case 'davies':
        return minus(damped(of(1)), times(linear, ionicStrength));
      case 'extended-debye-huckel':
        return damped(times(B, over(size, of(1000))));
    }
  };
  return times(A, shape());
}
