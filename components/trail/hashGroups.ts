const GROUP = /.{1,4}/g;

/** A hash in groups of four, as people read it out. */
export function hashGroups(hash: string): string[] {
  return hash.match(GROUP) ?? [];
}

/** Four lines of four groups: how a hash is compared with a paper. */
export function hashLines(hash: string): string[] {
  const groups = hashGroups(hash);
  const lines: string[] = [];
  for (let at = 0; at < groups.length; at += 4) lines.push(groups.slice(at, at + 4).join(' '));
  return lines;
}

/** Enough to tell two apart at a glance: the first three groups and the last two. */
export function shortHash(hash: string): string {
  const groups = hashGroups(hash);
  return `${groups.slice(0, 3).join(' ')} … ${groups.slice(-2).join(' ')}`;
}
