import { sealEvents } from './sealEvents';
import { voidStaleDrafts } from './voidStaleDrafts';

/** Every night: drafts that nobody touched are voided, then the trail is sealed. */
export async function runNightly(): Promise<void> {
  await voidStaleDrafts();
  await sealEvents();
}
