import path from 'node:path';
import type { TFontDictionary } from 'pdfmake/interfaces';

const FOLDERS = {
  '400': '400Regular/Barlow_400Regular.ttf',
  '500': '500Medium/Barlow_500Medium.ttf',
  '600': '600SemiBold/Barlow_600SemiBold.ttf',
  '700': '700Bold/Barlow_700Bold.ttf',
} as const;

const ROOT = path.resolve(import.meta.dirname, '../../node_modules/@expo-google-fonts/barlow');

export function fontFile(weight: keyof typeof FOLDERS): string {
  return path.join(ROOT, FOLDERS[weight]);
}

/** The only files that the document may read. */
export function isFontFile(file: string): boolean {
  return Object.keys(FOLDERS).some(
    (weight) => fontFile(weight as keyof typeof FOLDERS) === path.resolve(file),
  );
}

const single = (file: string) => ({ normal: file, bold: file, italics: file, bolditalics: file });

/** `Barlow` is regular and bold; the two weights between are families of their own. */
export function fonts(): TFontDictionary {
  const [regular, bold] = [fontFile('400'), fontFile('700')];
  return {
    Barlow: { normal: regular, bold, italics: regular, bolditalics: bold },
    'Barlow Medium': single(fontFile('500')),
    'Barlow SemiBold': single(fontFile('600')),
    'Barlow Bold': single(bold),
  };
}
