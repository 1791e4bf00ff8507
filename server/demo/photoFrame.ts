/* What every picture of the demo shares: its size, its light, its lettering. */

const WIDTH = 1120;
const HEIGHT = 840;

function escaped(words: string): string {
  return words.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('"', '&quot;');
}

/** A filter costs ten times what the drawing does: only the marker has one. */
const FILTERS = `
  <filter id="marker" x="-4%" y="-8%" width="108%" height="116%">
    <feTurbulence type="fractalNoise" baseFrequency="0.04" numOctaves="1" seed="9" result="noise"/>
    <feDisplacementMap in="SourceGraphic" in2="noise" scale="11"/>
  </filter>
`;

const PAINTS = `
  <linearGradient id="pipe"><stop offset="0" stop-color="#7d858a"/><stop offset="0.3" stop-color="#e6eaec"/><stop offset="1" stop-color="#8a9297"/></linearGradient>
  <linearGradient id="steel" x1="0" y1="0" x2="1" y2="1"><stop offset="0" stop-color="#d3d9dc"/><stop offset="0.55" stop-color="#b4bcc1"/><stop offset="1" stop-color="#98a1a6"/></linearGradient>
  <radialGradient id="glow"><stop offset="0" stop-color="#fffbe6" stop-opacity="0.9"/><stop offset="0.45" stop-color="#fffbe6" stop-opacity="0.45"/><stop offset="1" stop-color="#fffbe6" stop-opacity="0"/></radialGradient>
  <radialGradient id="vignette" cx="0.42" cy="0.34" r="0.85">
    <stop offset="0" stop-color="#fff" stop-opacity="0.22"/><stop offset="0.45" stop-color="#fff" stop-opacity="0"/>
    <stop offset="1" stop-color="#000" stop-opacity="0.42"/>
  </radialGradient>`;

interface Light {
  /** What lies behind, and how dark it grows away from the light. */
  wall: string;
  dark: string;
  /** Degrees that the phone was held askew. */
  turn: number;
}

/** Puts a drawing in front of a wall, turns it, and lays light over it. */
export function picture({ wall, dark, turn }: Light, body: string): string {
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${WIDTH}" height="${HEIGHT}" font-family="Barlow">
  <defs>${FILTERS}${PAINTS}
    <linearGradient id="wall" x1="0" y1="0" x2="1" y2="1"><stop offset="0" stop-color="${wall}"/><stop offset="1" stop-color="${dark}"/></linearGradient>
  </defs>
  <rect width="${WIDTH}" height="${HEIGHT}" fill="url(#wall)"/>
  <g transform="rotate(${turn} ${WIDTH / 2} ${HEIGHT / 2})">${body}</g>
  <rect width="${WIDTH}" height="${HEIGHT}" fill="url(#vignette)"/>
</svg>`;
}

interface Lettering {
  x: number;
  y: number;
  size: number;
  fill?: string;
  bold?: boolean;
  middle?: boolean;
}

export function text(
  words: string,
  { x, y, size, fill = '#1d2326', bold, middle }: Lettering,
): string {
  const weight = bold === true ? 700 : 400;
  const anchor = middle === true ? ' text-anchor="middle"' : '';
  return `<text x="${x}" y="${y}" font-size="${size}" font-weight="${weight}" fill="${fill}"${anchor}>${escaped(words)}</text>`;
}

export function screw(x: number, y: number, turn: number, radius: number): string {
  return `<g transform="translate(${x} ${y}) rotate(${turn})"><circle cx="2" cy="3" r="${radius}" fill="#4a5155" opacity="0.5"/><circle r="${radius}" fill="#aab1b5" stroke="#5d6468" stroke-width="2.5"/><circle cx="${-radius / 4}" cy="${-radius / 4}" r="${radius / 2}" fill="#d8dddf" opacity="0.7"/><rect x="${-radius * 0.75}" y="-2.5" width="${radius * 1.5}" height="5" fill="#434a4e"/></g>`;
}

/** A number that is always the same for the same words. */
export function ofWords(words: string, below: number): number {
  return [...words].reduce((sum, letter) => (sum * 31 + letter.charCodeAt(0)) % 9973, 7) % below;
}

type Box = readonly [x: number, y: number, width: number, height: number];

/** What a rectangle throws on the wall behind it, softer outward. */
export function shadow([x, y, width, height]: Box, round: number): string {
  return [18, 14, 10, 6, 2]
    .map(
      (out) =>
        `<rect x="${x + 10 - out / 2}" y="${y + 14 - out / 2}" width="${width + out}" height="${height + out}" rx="${round + out / 2}" opacity="0.09"/>`,
    )
    .join('');
}
