import { TSpan } from 'react-native-svg';
import { fonts } from '../ui/theme';

const italic = { fontFamily: fonts.numbers, fontStyle: 'italic' } as const;

/** Signs of quantities inside a FigureText: italic as quantities are, in the face that has them. */
export const alphaSign = <TSpan {...italic}>α</TSpan>;
export const betaSign = <TSpan {...italic}>β</TSpan>;
export const concentrationSign = <TSpan {...italic}>c</TSpan>;
export const meanChargeSign = <TSpan {...italic}>{'z\u0304'}</TSpan>;
export const activitySign = <TSpan {...italic}>a</TSpan>;
export const ionicStrengthSign = <TSpan {...italic}>I</TSpan>;
/** p upright, K italic, the prime set tight as the face draws it wide. */
export const pKPrimeSign = (
  <>
    <TSpan fontFamily={fonts.numbers}>p</TSpan>
    <TSpan {...italic}>K</TSpan>
    <TSpan {...italic} dx="-0.22em">
      ′
    </TSpan>
  </>
);
