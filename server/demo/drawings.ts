import { ofWords, picture, screw, shadow, text } from './photoFrame';

/* Pictures as a phone takes them on a job: a little askew, lit from one side, never quite clean. */

const PHASES: Record<string, string> = {
  '480Y/277': '480Y/277 V  3 PH  4 W',
  '208Y/120': '208Y/120 V  3 PH  4 W',
  '240/120 high-leg': '240/120 V  3 PH  4 W  HIGH LEG B',
  '120/240': '120/240 V  1 PH  3 W',
};
const MAKER = 'PELL HOLLOW SWITCHBOARD CO.';

/** A field of the plate: what it is in small letters, and what is stamped there. */
function plateField(label: string, value: string, x: number, y: number, width: number): string {
  return `<rect x="${x}" y="${y}" width="${width}" height="92" fill="#c9cdca" stroke="#585f62" stroke-width="2.5"/>
    ${text(label, { x: x + 14, y: y + 28, size: 21, fill: '#4a5154' })}
    ${text(value, { x: x + 14, y: y + 74, size: 40, bold: true, fill: '#23282a' })}`;
}

/** Slots that let the heat out, along the top of the door. */
function louvers(): string {
  return Array.from(
    { length: 9 },
    (_, slot) =>
      `<rect x="${236 + slot * 74}" y="34" width="52" height="13" rx="6" fill="#5f676b"/><rect x="${236 + slot * 74}" y="46" width="52" height="3" rx="1" fill="#d9dedf" opacity="0.7"/>`,
  ).join('');
}

/** The maker's plate on a panel's door. */
export function equipmentLabel(panel: string, system: string, siteName: string): string {
  const serial = `${panel}-${String(4000 + ofWords(panel + siteName, 5000))}`;
  const hinge = (y: number) =>
    `<rect x="40" y="${y}" width="30" height="120" rx="8" fill="#8d959a" stroke="#555d61" stroke-width="3"/><line x1="40" y1="${y + 40}" x2="70" y2="${y + 40}" stroke="#555d61" stroke-width="3"/><line x1="40" y1="${y + 80}" x2="70" y2="${y + 80}" stroke="#555d61" stroke-width="3"/>`;
  const corners = [
    [206, 148],
    [914, 148],
    [206, 688],
    [914, 688],
  ] as const;
  const body = `<rect x="55" y="-80" width="5" height="1010" fill="#565e62"/><rect x="60" y="-80" width="4" height="1010" fill="#e4e8e9" opacity="0.8"/>
    ${hinge(120)}${hinge(600)}${louvers()}
    <g transform="translate(1035 420)"><circle r="50" fill="#757d81"/><circle r="42" fill="#a3abaf" stroke="#596165" stroke-width="3"/><rect x="-9" y="-34" width="18" height="68" rx="8" fill="#5b6367" transform="rotate(12)"/></g>
    <path d="M880 735l60 22M905 728l70 30M130 640l24 60" stroke="#dfe4e5" stroke-width="2" opacity="0.55"/>
    ${shadow([180, 122, 760, 592], 12)}<rect x="180" y="122" width="760" height="592" rx="12" fill="#d6d9d5"/>
    <rect x="190" y="132" width="740" height="572" rx="8" fill="none" stroke="#6a7174" stroke-width="3"/>
    <rect x="240" y="160" width="640" height="54" fill="#23303a"/>
    ${text(MAKER, { x: 560, y: 198, size: 33, fill: '#e9edea', bold: true, middle: true })}
    ${text(`PANEL ${panel}`, { x: 240, y: 298, size: 76, bold: true })}
    ${plateField('SYSTEM', PHASES[system] ?? system, 240, 328, 640)}
    ${plateField('MAINS', '225 A', 240, 428, 208)}${plateField('FREQUENCY', '60 Hz', 456, 428, 208)}${plateField('ENCLOSURE', 'TYPE 1', 672, 428, 208)}
    ${plateField('SHORT CIRCUIT RATING', '18 kA SYM', 240, 528, 316)}${plateField('SERIAL', serial, 564, 528, 316)}
    ${text(`INSTALLED FOR ${siteName.toUpperCase()}`, { x: 240, y: 668, size: 26, fill: '#4a5154' })}
    ${corners.map(([x, y]) => `<circle cx="${x}" cy="${y}" r="11" fill="#8b9296" stroke="#4f565a" stroke-width="2.5"/><circle cx="${x - 3}" cy="${y - 3}" r="4" fill="#dfe3e4"/>`).join('')}`;
  return picture({ wall: '#b4bbbf', dark: '#7b848a', turn: ofWords(panel, 5) - 2 }, body);
}

const LOADS = [
  'Ltg north',
  'Ltg south',
  'Corridor ltg',
  'Stair ltg',
  'Rest rms ltg',
  'Spare',
  'Exit signs',
  'Ext. wall ltg',
  'Storage ltg',
];
const ROWS = 11;
const lineAt = (row: number) => 260 + row * 45;

/** Words as a hand writes them in a narrow column: never on the line twice the same way. */
function handwritten(words: string, x: number, y: number, key: string): string {
  const turn = (ofWords(key, 30) - 15) / 10;
  const rise = ofWords(`${key} rise`, 7) - 3;
  return `<g transform="translate(${x} ${y + rise}) rotate(${turn}) skewX(-9)">${text(words, { x: 0, y: 0, size: 29, fill: '#2c4a78' })}</g>`;
}

const loadOf = (panel: string, number: number) =>
  LOADS[ofWords(`${panel}${number}`, LOADS.length)] ?? '';

/** What a hand wrote on one line of the card: an odd circuit at the left, an even one at the right. */
function writtenRow(panel: string, row: number, first: number): string {
  const odd = first + row * 2;
  return [odd, odd + 1]
    .map((number, half) => {
      const x = half === 0 ? 226 : 632;
      return handwritten(loadOf(panel, number), x, lineAt(row), `${panel}${number}`);
    })
    .join('');
}

/** What is printed on it. */
function printedRow(panel: string, row: number, first: number): string {
  const y = lineAt(row);
  const half = (number: number, x: number, at: number) => {
    const amperes = loadOf(panel, number) === 'Spare' ? '' : '20';
    return `${text(String(number), { x, y, size: 27, bold: true, middle: true })}
      ${text(amperes, { x: at + 226, y, size: 25, fill: '#4b4a44', middle: true })}`;
  };
  const odd = first + row * 2;
  return `<line x1="150" y1="${y + 12}" x2="970" y2="${y + 12}" stroke="#b9b29d" stroke-width="2"/>
    ${half(odd, 186, 226)}${half(odd + 1, 592, 632)}`;
}

/** Where the ring is drawn; undefined where the circuit is not on the card. */
function ringAt(circuit: string, first: number): string {
  const number = Number(circuit);
  const row = Math.floor((number - first) / 2);
  if (!Number.isInteger(number) || row < 0 || row >= ROWS) return '';
  const x = (number - first) % 2 === 0 ? 338 : 746;
  const y = lineAt(row) - 10;
  return `<g fill="none" stroke="#b92a25" stroke-width="5" stroke-linecap="round">
    <path d="M${x - 186} ${y + 4}C${x - 188} ${y - 34} ${x + 180} ${y - 40} ${x + 186} ${y}C${x + 188} ${y + 34} ${x - 190} ${y + 36} ${x - 192} ${y - 8}"/></g>`;
}

/** The card in the pocket of a panel's door, with the circuit in question ringed by hand. */
export function panelSchedule(panel: string, circuit: string): string {
  const number = Number(circuit);
  const first = Number.isInteger(number) && number > 2 * ROWS ? 21 : 1;
  const rows = Array.from({ length: ROWS }, (_, row) => row);
  const printed = rows.map((row) => printedRow(panel, row, first));
  const written = rows.map((row) => writtenRow(panel, row, first));
  const rule = (x: number, width: number) =>
    `<line x1="${x}" y1="214" x2="${x}" y2="738" stroke="#a29b86" stroke-width="${width}"/>`;
  const body = `<rect x="-40" y="-60" width="1200" height="960" fill="#9aa2a7"/>
    <path d="M40 40h1040v760H40z" fill="#868f95"/><path d="M40 40h1040v8H48v752h-8z" fill="#d5dadc" opacity="0.6"/>
    ${shadow([118, 62, 884, 724], 2)}<path d="M118 64L1000 58L1004 782L122 790z" fill="#f1ebd7"/>
    <path d="M118 64L1000 58L1001 100L119 108z" fill="#fff" opacity="0.35"/>
    ${text('CIRCUIT DIRECTORY', { x: 150, y: 138, size: 34, fill: '#4b4a44', bold: true })}
    ${text('PANEL', { x: 690, y: 136, size: 24, fill: '#6b695f' })}
    <rect x="150" y="172" width="820" height="44" fill="#ddd5bd"/>
    ${['CKT', 'LOAD', 'A'].map((word, at) => text(word, { x: [186, 300, 452][at] ?? 0, y: 203, size: 22, fill: '#5a584f', bold: true, middle: true })).join('')}
    ${['CKT', 'LOAD', 'A'].map((word, at) => text(word, { x: [592, 706, 858][at] ?? 0, y: 203, size: 22, fill: '#5a584f', bold: true, middle: true })).join('')}
    ${printed.join('')}${rule(212, 2)}${rule(560, 4)}${rule(618, 2)}
    <g>${written.join('')}${ringAt(circuit, first)}
      <g transform="translate(778 138) rotate(-2) skewX(-9)">${text(panel, { x: 0, y: 0, size: 52, fill: '#2c4a78', bold: true })}</g></g>
    <path d="M118 600L520 60L700 59L200 789L122 790z" fill="#fff" opacity="0.13"/>
    <path d="M90 640L1030 634L1034 816L94 824z" fill="#dfe9ee" opacity="0.2"/><path d="M90 640L1030 634" stroke="#fff" stroke-width="4" opacity="0.55"/>`;
  return picture({ wall: '#9aa2a7', dark: '#5d666b', turn: 1 - ofWords(panel, 4) }, body);
}

/** Painted blocks behind the box. */
function blocks(): string {
  const rows = [-60, 150, 360, 570, 780];
  return rows
    .map(
      (y, row) =>
        `<line x1="-60" y1="${y}" x2="1180" y2="${y}" stroke="#a9a497" stroke-width="7"/><line x1="-60" y1="${y + 6}" x2="1180" y2="${y + 6}" stroke="#f3f0e6" stroke-width="3"/>
         ${[0, 1, 2, 3].map((column) => `<line x1="${(row % 2 === 0 ? 40 : 240) + column * 410}" y1="${y}" x2="${(row % 2 === 0 ? 40 : 240) + column * 410}" y2="${y + 210}" stroke="#b1ac9f" stroke-width="6"/>`).join('')}`,
    )
    .join('');
}

/** A conduit that comes from above, with its connector in the box. */
function conduit(x: number): string {
  return `${shadow([x, -60, 84, 196], 4)}<rect x="${x}" y="-60" width="84" height="196" fill="url(#pipe)"/>
    <rect x="${x - 16}" y="96" width="116" height="62" rx="8" fill="url(#pipe)" stroke="#666e73" stroke-width="3"/>
    ${screw(x + 42, 126, 30, 12)}`;
}

/** A steel box cover with the circuit written on it by marker. */
export function boxCover(circuit: string): string {
  const size = Math.min(128, 860 / circuit.length);
  const body = `${blocks()}${conduit(360)}${conduit(690)}
    ${shadow([262, 146, 600, 586], 40)}<rect x="262" y="146" width="600" height="586" rx="40" fill="#a7afb4"/>
    <rect x="272" y="156" width="580" height="566" rx="34" fill="url(#steel)" stroke="#6d757a" stroke-width="4"/>
    <rect x="322" y="206" width="480" height="466" rx="26" fill="none" stroke="#8b9398" stroke-width="4"/><rect x="327" y="211" width="470" height="456" rx="23" fill="none" stroke="#e6eaec" stroke-width="3" opacity="0.8"/>
    ${screw(300, 186, 20, 19)}${screw(824, 690, 65, 19)}
    <circle cx="824" cy="186" r="15" fill="#596165"/><circle cx="300" cy="690" r="15" fill="#596165"/>
    <path d="M330 640c60-18 90 8 150-6M700 240c30 14 50 8 78 16" stroke="#e8ecee" stroke-width="3" fill="none" opacity="0.6"/>
    <g filter="url(#marker)"><g transform="rotate(-5 562 440) skewX(-6)">${text(circuit, { x: 610, y: 474, size, fill: '#101415', bold: true, middle: true })}</g>
      <path d="M400 540c90-14 220-22 330-20" stroke="#101415" stroke-width="9" fill="none" stroke-linecap="round"/></g>`;
  return picture({ wall: '#dcd8cc', dark: '#9c978a', turn: ofWords(circuit, 5) - 2 }, body);
}
