import type { TextStyle } from 'react-native';

export type FontWeight = '400' | '500' | '600' | '700';

/**
 * The style of one weight of Barlow. On the web the faces come from
 * `public/base.css`, so that text is drawn before any script has run.
 */
export function font(weight: FontWeight): Pick<TextStyle, 'fontFamily' | 'fontWeight'> {
  return { fontFamily: 'Barlow, sans-serif', fontWeight: weight };
}

/** Real small caps of the face, for capitals as well. React Native's types lack the property. */
export const smallCaps = { fontFeatureSettings: '"smcp", "c2sc", "tnum"' } as TextStyle;

/** Nothing to wait for: the style sheet swaps the faces in. */
export function useFontsReady(): boolean {
  return true;
}
