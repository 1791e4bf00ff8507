/** A file that a person chose, or null where nothing was chosen. */
export interface Files {
  /** Whether this device can hand over a file here. */
  readonly canPick: boolean;
  /** Reads one text file that the person chooses. */
  pickText: (accept: string) => Promise<PickedText | null>;
  /** Gives the person a text as a file. */
  saveText: (name: string, text: string, type: string) => void;
}

export type PickedText = { text: string } | { fault: 'large' | 'not-text' };
