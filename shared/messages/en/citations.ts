/** Words inside a citation. Numbers and names of standards stay as they are printed. */
export const citations = {
  /** What a rule of our own rests on. */
  ownRule: 'Rule of this tool',
};
