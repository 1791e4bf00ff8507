/**
 * Draws SVG texts as JPEG: a JSON list of texts on standard input, a JSON list
 * of base64 on standard output. A process of its own, because the server's
 * process never opens the SVG decoder. Plain JavaScript: it starts at once.
 */
import sharp from 'sharp';

/** The grain of a small sensor in poor light, the same for every photo: made once, since it costs as much as a drawing. */
const noise = { type: 'gaussian', mean: 128, sigma: 9 };
const grain = await sharp({
  create: { width: 1120, height: 840, channels: 3, background: '#000', noise },
})
  .grayscale()
  .png({ compressionLevel: 0 })
  .toBuffer();

let input = '';
for await (const chunk of process.stdin) input += chunk;

const photos = [];
for (const svg of JSON.parse(input)) {
  const photo = await sharp(Buffer.from(svg))
    .composite([{ input: grain, blend: 'soft-light' }])
    .jpeg({ quality: 82 })
    .toBuffer();
  photos.push(photo.toString('base64'));
}
process.stdout.write(JSON.stringify(photos));
