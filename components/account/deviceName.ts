const BROWSERS: readonly (readonly [RegExp, string])[] = [
  [/Edg(e|A|iOS)?\//, 'Edge'],
  [/OPR\/|Opera/, 'Opera'],
  [/Firefox\/|FxiOS\//, 'Firefox'],
  [/Chrom(e|ium)\/|CriOS\//, 'Chrome'],
  [/Safari\//, 'Safari'],
];
const SYSTEMS: readonly (readonly [RegExp, string])[] = [
  [/iPhone/, 'iPhone'],
  [/iPad/, 'iPad'],
  [/Android/, 'Android'],
  [/Windows/, 'Windows'],
  [/Mac OS X|Macintosh/, 'macOS'],
  [/Linux|X11/, 'Linux'],
];

const first = (agent: string, names: readonly (readonly [RegExp, string])[]) =>
  names.find(([pattern]) => pattern.test(agent))?.[1];

/** Browser and system from a `User-Agent`, as far as it says; a hint for a person, nothing more. */
export function deviceName(
  agent: string,
  words: { onSystem: (browser: string, system: string) => string; unknownDevice: string },
): string {
  const browser = first(agent, BROWSERS);
  const system = first(agent, SYSTEMS);
  if (browser !== undefined && system !== undefined) return words.onSystem(browser, system);
  return browser ?? system ?? words.unknownDevice;
}
