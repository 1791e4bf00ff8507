/* Pictures as a phone takes them on a job: flat, a little askew, lit from one side. */

const WIDTH = 1120;
const HEIGHT = 840;

function escaped(text: string): string {
  return text.replaceAll('&', '&amp;').replaceAll('<', '&lt;').replaceAll('"', '&quot;');
}

function picture(background: string, body: string, turn = 0): string {
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${WIDTH}" height="${HEIGHT}" font-family="Barlow">
  <defs>
    <linearGradient id="wall" x1="0" y1="0" x2="1" y2="1">
      <stop offset="0" stop-color="${background}"/><stop offset="1" stop-color="#6d7378"/>
    </linearGradient>
    <radialGradient id="lamp" cx="0.3" cy="0.2" r="0.9">
      <stop offset="0" stop-color="#fff" stop-opacity="0.35"/><stop offset="1" stop-color="#000" stop-opacity="0.28"/>
    </radialGradient>
  </defs>
  <rect width="${WIDTH}" height="${HEIGHT}" fill="url(#wall)"/>
  <g transform="rotate(${turn} ${WIDTH / 2} ${HEIGHT / 2})">${body}</g>
  <rect width="${WIDTH}" height="${HEIGHT}" fill="url(#lamp)"/>
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

function text(words: string, { x, y, size, fill = '#1d2326', bold, middle }: Lettering): string {
  const weight = bold === true ? 700 : 400;
  const anchor = middle === true ? ' text-anchor="middle"' : '';
  return `<text x="${x}" y="${y}" font-size="${size}" font-weight="${weight}" fill="${fill}"${anchor}>${escaped(words)}</text>`;
}

function screw(x: number, y: number, turn: number): string {
  return `<g transform="translate(${x} ${y}) rotate(${turn})"><circle r="17" fill="#9aa1a6" stroke="#5d6468" stroke-width="3"/><rect x="-13" y="-2.5" width="26" height="5" fill="#4a5054"/></g>`;
}

/** A number that is always the same for the same words. */
function ofWords(words: string, below: number): number {
  return [...words].reduce((sum, letter) => (sum * 31 + letter.charCodeAt(0)) % 9973, 7) % below;
}

const PHASES: Record<string, string> = {
  '480Y/277': '480Y/277 V   3 PH 4 W',
  '208Y/120': '208Y/120 V   3 PH 4 W',
  '120/240': '120/240 V   1 PH 3 W',
};

/** The maker's plate on a panel's door. */
export function equipmentLabel(panel: string, system: string, siteName: string): string {
  const lines = [
    PHASES[system] ?? system,
    'MAINS 225 A   60 HZ',
    'SHORT CIRCUIT 18 kA SYM',
    `SERIAL ${panel}-${String(4000 + ofWords(panel + siteName, 5000))}`,
  ];
  const body = `<rect x="150" y="130" width="820" height="580" rx="10" fill="#e4e4de" stroke="#3c4347" stroke-width="4"/>
    <rect x="150" y="130" width="820" height="150" rx="10" fill="#22303a"/>
    ${text(`PANEL ${panel}`, { x: 190, y: 232, size: 84, fill: '#fff', bold: true })}
    ${lines.map((line, index) => text(line, { x: 190, y: 366 + index * 78, size: 52, bold: index === 0 })).join('')}
    ${text(siteName, { x: 190, y: 676, size: 34, fill: '#555c60' })}
    ${[
      [120, 100],
      [1000, 100],
      [120, 740],
      [1000, 740],
    ]
      .map(([x = 0, y = 0], index) => screw(x, y, index * 37))
      .join('')}`;
  return picture('#b9bfc2', body, ofWords(panel, 5) - 2);
}

const LOADS = [
  'Lighting N',
  'Lighting S',
  'Corridor',
  'Stair',
  'Rest rooms',
  'Spare',
  'Exit lights',
];

/** The card inside a panel's door, with the circuit in question marked by hand. */
export function panelSchedule(panel: string, circuit: string, circuits: string[]): string {
  const listed = [...new Set([...circuits, circuit])].slice(0, 9);
  const rows = listed.map((number, index) => {
    const y = 300 + index * 52;
    const load = LOADS[ofWords(`${panel}${number}`, LOADS.length)] ?? '';
    const ring =
      number === circuit
        ? `<ellipse cx="560" cy="${y - 14}" rx="378" ry="32" fill="none" stroke="#c2312b" stroke-width="5" transform="rotate(-1 560 ${y})"/>`
        : '';
    return `<line x1="180" y1="${y + 14}" x2="940" y2="${y + 14}" stroke="#b4ae9c" stroke-width="2"/>
      ${text(number, { x: 210, y, size: 36, bold: true })}${text(load, { x: 330, y, size: 36, fill: '#27415f' })}
      ${text('20 A', { x: 830, y, size: 32, fill: '#555c60' })}${ring}`;
  });
  const body = `<rect x="140" y="80" width="840" height="690" fill="#f3eedd" stroke="#8b8675" stroke-width="3"/>
    ${text(`PANEL ${panel}   DIRECTORY`, { x: 180, y: 165, size: 54, bold: true })}
    ${text('CKT', { x: 205, y: 232, size: 28, fill: '#7a7565' })}${text('LOAD', { x: 330, y: 232, size: 28, fill: '#7a7565' })}
    ${rows.join('')}`;
  return picture('#8f979c', body, 1 - ofWords(panel, 4));
}

/** A steel box cover with the circuit written on it by marker. */
export function boxCover(circuit: string): string {
  const body = `<rect x="60" y="-40" width="90" height="920" fill="#c7ccd0" stroke="#70777b" stroke-width="4"/>
    <rect x="290" y="150" width="560" height="540" rx="46" fill="#b7bec3" stroke="#6b7276" stroke-width="5"/>
    <rect x="312" y="172" width="516" height="496" rx="34" fill="none" stroke="#d5dadd" stroke-width="3"/>
    ${screw(370, 230, 20)}${screw(770, 610, 65)}
    <g transform="rotate(-4 570 430)">${text(circuit, { x: 570, y: 450, size: 118, fill: '#14181a', bold: true, middle: true })}</g>`;
  return picture('#d9d5cb', body, ofWords(circuit, 7) - 3);
}

/** The luminaire back in its place, lit. */
export function finishedWork(equipment: string): string {
  const tiles = Array.from({ length: 12 }, (_, index) => {
    const [column, row] = [index % 4, Math.floor(index / 4)];
    return `<rect x="${column * 280}" y="${row * 280}" width="276" height="276" fill="#e8e6e0" stroke="#c4c1b8" stroke-width="4"/>`;
  });
  const left = 280 * (1 + ofWords(equipment, 2));
  const body = `${tiles.join('')}
    <rect x="${left}" y="280" width="276" height="276" fill="#9fa5a8"/>
    <rect x="${left + 14}" y="294" width="248" height="248" rx="6" fill="#fffdf2"/>
    <circle cx="${left + 138}" cy="418" r="330" fill="#fff8d6" opacity="0.35"/>
    <rect x="${left + 170}" y="508" width="84" height="26" fill="#fff" stroke="#888" stroke-width="2"/>
    ${text(equipment.split(' ').at(-1) ?? '', { x: left + 212, y: 528, size: 20, middle: true })}`;
  return picture('#d8d6cf', body, 0);
}
