import { mkdir, writeFile } from 'node:fs/promises';
import path from 'node:path';
import sharp from 'sharp';

/**
 * Draws the pictures of the app's icon from the mark. Run by hand when the
 * mark changes; the pictures are kept in the repository.
 */
const root = path.resolve(import.meta.dirname, '../..');
const INK = '#1B1916';
const PAPER = '#F6F1E6';

/** The mark on its 32 by 18 grid, centred in a square with `share` of the width. */
function markSvg(size: number, share: number, ground: string | undefined): Buffer {
  const scale = (size * share) / 32;
  const left = (size - 32 * scale) / 2;
  const top = (size - 18 * scale) / 2 - 10.5 * scale;
  const fill =
    ground === undefined ? '' : `<rect width="${size}" height="${size}" fill="${ground}"/>`;
  return Buffer.from(
    `<svg xmlns="http://www.w3.org/2000/svg" width="${size}" height="${size}">${fill}` +
      `<g transform="translate(${left} ${top}) scale(${scale})">` +
      `<path d="M0 23.5h5a11 11 0 0 1 22 0h5" fill="none" stroke="${INK}" stroke-width="3"/>` +
      `<circle cx="16" cy="23.5" r="3.5" fill="${INK}"/></g></svg>`,
  );
}

async function draw(file: string, size: number, share: number, ground?: string): Promise<void> {
  const target = path.join(root, file);
  await mkdir(path.dirname(target), { recursive: true });
  await writeFile(
    target,
    await sharp(markSvg(size, share, ground))
      .png()
      .toBuffer(),
  );
}

async function main(): Promise<void> {
  await draw('public/icons/icon-192.png', 192, 0.72, PAPER);
  await draw('public/icons/icon-512.png', 512, 0.72, PAPER);
  // A mask may cut a fifth from each side.
  await draw('public/icons/icon-maskable-512.png', 512, 0.5, PAPER);
  await draw('public/icons/apple-touch-icon.png', 180, 0.68, PAPER);
  await draw('assets/images/icon.png', 1024, 0.68, PAPER);
  await draw('assets/images/favicon.png', 64, 0.94);
}

void main();
