/**
 * What people choose first. A password that is nothing but these, in whatever
 * case, with digits and signs around or letters written as digits, is common.
 */
const WORDS = new Set(
  `
  password passw0rd passwort pass passcode contrasena contraseña clave secret secreto letmein
  letmeinnow welcome bienvenido hello hola admin administrator administrador root user usuario test
  testing guest login signin master default changeme change me temp temporary company work
  qwerty qwertyuiop qwertz azerty asdf asdfgh asdfghjkl zxcvbn zxcvbnm qazwsx qazwsxedc wsxedc
  abc abcd abcde abcdef abcdefg abcdefgh abcdefghij abcdefghijkl
  iloveyou loveyou love you teamo tequiero princess princesa sunshine football futbol baseball
  basketball soccer hockey superman batman spiderman pokemon starwars dragon monkey shadow michael
  jennifer jordan ashley daniel charlie thomas jesus maria jose guadalupe america mexico
  trustno one computer internet whatever summer winter spring autumn fall verano invierno
  january february march april may june july august september october november december
  monday tuesday wednesday thursday friday saturday sunday
  correct horse battery staple chocolate cheese freedom liberty killer access flower blink
  electric electrician electrical electricista lighting wideberth wide berth demo safety
  supervisor helper lead google facebook samsung apple microsoft windows android iphone
  the is my our your a i am this
`
    .trim()
    .split(/\s+/),
);

const LETTER_OF_DIGIT: Readonly<Record<string, string>> = {
  '0': 'o',
  '1': 'i',
  '3': 'e',
  '4': 'a',
  '5': 's',
  '7': 't',
  '@': 'a',
  $: 's',
  '!': 'i',
};

/** True for a password that would be among the first guesses. */
export function isCommonPassword(password: string): boolean {
  const plain = password.normalize('NFKC').toLowerCase();
  if (isRepetitive(plain)) return true;
  const letters = plain.replaceAll(/[^\p{L}]/gu, '');
  const translated = [...plain]
    .map((sign) => LETTER_OF_DIGIT[sign] ?? sign)
    .join('')
    .replaceAll(/[^\p{L}]/gu, '');
  return [letters, translated].some((candidate) => isOnlyWords(candidate));
}

/** One short piece over and over, or a run such as 123456789012. */
function isRepetitive(text: string): boolean {
  if (new Set(text).size <= 3 || /^(.{1,4})\1+.{0,3}$/su.test(text)) return true;
  const steps = [...text]
    .slice(1)
    .map((sign, i) => (sign.codePointAt(0) ?? 0) - text.charCodeAt(i));
  const even = steps.filter((step) => Math.abs(step) === 1 || step === 0 || Math.abs(step) === 9);
  return even.length === steps.length;
}

/** Whether the text is nothing but words of the list, one after the other. */
function isOnlyWords(text: string): boolean {
  const reached = new Set([0]);
  for (let start = 0; start < text.length; start += 1) {
    if (!reached.has(start)) continue;
    for (let end = start + 1; end <= text.length; end += 1) {
      if (WORDS.has(text.slice(start, end))) reached.add(end);
    }
  }
  return reached.has(text.length);
}
