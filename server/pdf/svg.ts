import {
  dotsPath,
  hatchPath,
  px,
  rectanglePath,
  ROLE_TOKENS,
  type Drawing,
  type Primitive,
  type Role,
} from '@/shared/drawing/primitives';
import { barricadeStripes, fillZone, type ZoneRole } from '@/shared/drawing/hatch';
import type { Strokes } from '@/shared/record';
import type { Content, ContentSvg } from 'pdfmake/interfaces';
import { COLORS } from './style';
import { printable } from './text';

const ENTITIES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&apos;',
};

/** Words inside a drawing: nothing that a person typed can become markup. */
export function escapeXml(words: string): string {
  return printable(words)
    .replaceAll('\n', ' ')
    .replace(/[&<>"']/g, (character) => ENTITIES[character] ?? '');
}

const FAMILIES = { 500: 'Barlow Medium', 600: 'Barlow SemiBold', 700: 'Barlow Bold' } as const;

function colorOf(role: Role | undefined): string {
  return role === undefined ? 'none' : COLORS[ROLE_TOKENS[role]];
}

function element(shape: Primitive): string {
  switch (shape.kind) {
    case 'hatch':
      return `<path d="${hatchPath(shape.segments)}" fill="none" stroke="${colorOf(shape.role)}" stroke-width="${px(shape.width)}"/>`;
    case 'dots':
      return `<path d="${dotsPath(shape.points)}" fill="none" stroke="${colorOf(shape.role)}" stroke-width="${px(shape.radius * 2)}" stroke-linecap="round"/>`;
    case 'circle':
      return `<circle cx="${px(shape.cx)}" cy="${px(shape.cy)}" r="${px(shape.r)}" fill="${colorOf(shape.fill)}" stroke="${colorOf(shape.stroke)}" stroke-width="${px(shape.width ?? 0)}"/>`;
    case 'path': {
      const dash = shape.dash ? ` stroke-dasharray="${shape.dash.join(' ')}"` : '';
      const round = shape.round ? ' stroke-linecap="round" stroke-linejoin="round"' : '';
      return `<path d="${shape.d}" fill="${colorOf(shape.fill)}" stroke="${colorOf(shape.stroke)}" stroke-width="${px(shape.width ?? 0)}"${dash}${round}/>`;
    }
    case 'text': {
      const place = `x="${px(shape.x)}" y="${px(shape.y)}" text-anchor="${shape.anchor}" font-family="${FAMILIES[shape.weight]}" font-size="${shape.size}"`;
      const words = escapeXml(shape.text);
      const halo =
        shape.halo > 0
          ? `<text ${place} fill="${COLORS.paper}" stroke="${COLORS.paper}" stroke-width="${shape.halo}" stroke-linejoin="round">${words}</text>`
          : '';
      return `${halo}<text ${place} fill="${colorOf(shape.role)}">${words}</text>`;
    }
  }
}

function svg(width: number, height: number, inside: string): string {
  return `<svg xmlns="http://www.w3.org/2000/svg" width="${px(width)}" height="${px(height)}" viewBox="0 0 ${px(width)} ${px(height)}">${inside}</svg>`;
}

/** A drawing as vectors, in the colours of print. */
export function drawingSvg(drawing: Drawing): string {
  return svg(drawing.width, drawing.height, drawing.primitives.map(element).join(''));
}

/** The swatch that stands beside a distance, as wide as high is 24 to 34. */
export function swatchSvg(role: ZoneRole | 'barricade'): string {
  const box = { left: 1, top: 1, right: 23, bottom: 33 };
  const frame: Primitive = { kind: 'path', d: rectanglePath(box), stroke: 'ink', width: 1.2 };
  const filling =
    role === 'barricade'
      ? barricadeStripes({ left: 8, top: 1, right: 16, bottom: 33 })
      : [fillZone(role, { box })];
  return svg(24, 34, [...filling, frame].map(element).join(''));
}

/** The mark: a line that keeps one distance from a point. */
export function markSvg(): string {
  return `<svg xmlns="http://www.w3.org/2000/svg" width="28" height="15.75" viewBox="0 10.5 32 18"><path d="M0 23.5h5a11 11 0 0 1 22 0h5" fill="none" stroke="${COLORS.ink}" stroke-width="3"/><circle cx="16" cy="23.5" r="3.5" fill="${COLORS.ink}"/></svg>`;
}

/** The mark of a state that keeps people away, on a banner. */
export function stateSvg(state: 'energized' | 'not-proved' | 'not-in-force'): string {
  const inside = {
    energized: `<rect x="1" y="1" width="18" height="18" fill="${COLORS.red}"/><path d="M5 5l10 10M15 5L5 15" stroke="${COLORS.onRed}" stroke-width="2.4"/>`,
    'not-proved': `<rect x="2" y="2" width="16" height="16" fill="none" stroke="${COLORS.onRed}" stroke-width="2"/><circle cx="10" cy="10" r="2.6" fill="${COLORS.onRed}"/>`,
    'not-in-force': `<path d="M3 3l14 14M17 3L3 17" stroke="${COLORS.ink}" stroke-width="2.6"/>`,
  }[state];
  return svg(20, 20, inside);
}

/** Drawn strokes, fitted into a box and never enlarged. */
export function strokesSvg(strokes: Strokes, width: number, height: number): string {
  const points = strokes.flat();
  const xs = points.map(([x]) => x);
  const ys = points.map(([, y]) => y);
  const [left, top] = [Math.min(...xs), Math.min(...ys)];
  const scale = Math.min(
    1,
    (width - 6) / Math.max(1, Math.max(...xs) - left),
    (height - 6) / Math.max(1, Math.max(...ys) - top),
  );
  const d = strokes
    .filter((stroke) => stroke.length > 0)
    .map((stroke) => {
      const steps = stroke.map(([x, y], index) => {
        const at = `${px(3 + (x - left) * scale)} ${px(3 + (y - top) * scale)}`;
        return `${index === 0 ? 'M' : 'L'}${at}`;
      });
      // One point alone is a dot.
      return stroke.length === 1 ? `${steps.join('')}h.01` : steps.join('');
    })
    .join('');
  return svg(
    width,
    height,
    `<path d="${d}" fill="none" stroke="${COLORS.ink}" stroke-width="1.4" stroke-linecap="round" stroke-linejoin="round"/>`,
  );
}

/** A picture with the words that stand for it where it cannot be seen. */
export function figure(picture: string, alt: string, width: number, height: number): Content {
  const node: ContentSvg & { alt: string } = { svg: picture, width, height, alt: printable(alt) };
  return node;
}
