/**
 * Draws SVG texts as JPEG: a JSON list of texts on standard input, a JSON list
 * of base64 on standard output. A process of its own, because the server's
 * process never opens the SVG decoder. Plain JavaScript: it starts at once.
 */
import sharp from 'sharp';

let input = '';
for await (const chunk of process.stdin) input += chunk;

const photos = [];
for (const svg of JSON.parse(input)) {
  const photo = await sharp(Buffer.from(svg)).jpeg({ quality: 82 }).toBuffer();
  photos.push(photo.toString('base64'));
}
process.stdout.write(JSON.stringify(photos));
