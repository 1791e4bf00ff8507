/** Words inside a citation. Numbers and names of standards stay as they are printed. */
export const citations = {
  /** Standards that are a description and not a name. */
  ownRule: 'Rule of this tool',
  /** The parts of a table's name, replaced one by one; the longest first. */
  parts: [] as readonly { from: string; to: string }[],
};
