import { Barlow_400Regular } from '@expo-google-fonts/barlow/400Regular';
import { Barlow_500Medium } from '@expo-google-fonts/barlow/500Medium';
import { Barlow_600SemiBold } from '@expo-google-fonts/barlow/600SemiBold';
import { Barlow_700Bold } from '@expo-google-fonts/barlow/700Bold';
import { useFonts } from 'expo-font';
import type { TextStyle } from 'react-native';

export type FontWeight = '400' | '500' | '600' | '700';

const FAMILIES: Readonly<Record<FontWeight, string>> = {
  '400': 'Barlow_400Regular',
  '500': 'Barlow_500Medium',
  '600': 'Barlow_600SemiBold',
  '700': 'Barlow_700Bold',
};

/** The style of one weight of Barlow: on a phone each face is a family of its own. */
export function font(weight: FontWeight): Pick<TextStyle, 'fontFamily' | 'fontWeight'> {
  return { fontFamily: FAMILIES[weight] };
}

/** Small caps for all but capitals: a phone has no setting for the rest. */
export const smallCaps: TextStyle = { fontVariant: ['tabular-nums', 'small-caps'] };

/** True once the faces are in memory; text measured before would be cut off. */
export function useFontsReady(): boolean {
  const [loaded, error] = useFonts({
    Barlow_400Regular,
    Barlow_500Medium,
    Barlow_600SemiBold,
    Barlow_700Bold,
  });
  return loaded || error !== null;
}
