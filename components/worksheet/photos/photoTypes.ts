import type { Attachment } from '@/shared/record';

/** A photo that was chosen and is not on the server yet. */
export interface WaitingPhoto {
  id: string;
  caption: string;
  file: Blob;
}

export type PhotoFault = 'type' | 'large' | 'pixels' | 'damaged' | 'offline';

export interface NewPhoto extends WaitingPhoto {
  section: Attachment['section'];
}

/** What a device does with photos: only a browser can choose and send them here. */
export interface PhotoFiles {
  readonly canPick: boolean;
  /** Whether there is a camera to hold up, as on a phone. */
  hasCamera: () => boolean;
  pick: (from: 'camera' | 'files') => Promise<{ file: Blob; name: string }[]>;
  /** Sends one photo; throws an `ApiProblem`, or a `TypeError` where no answer came. */
  send: (
    worksheetId: string,
    photo: NewPhoto,
    onProgress: (percent: number) => void,
  ) => Promise<Attachment>;
  /** An address under which a photo on this device can be shown. */
  urlOf: (file: Blob) => string;
  release: (url: string) => void;
}
