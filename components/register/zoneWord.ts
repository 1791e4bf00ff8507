/** A time zone as people call it; one that has no such name, by its city. */
export function zoneWord(zones: Readonly<Record<string, string>>, timeZone: string): string {
  const city = timeZone.split('/').at(-1) ?? timeZone;
  return zones[timeZone] ?? city.replaceAll('_', ' ');
}
