import { contentFacts, type ContentFact, type FactGroup } from '@/shared/contentFacts';
import { differences } from '@/shared/differences';
import { fieldLabel, type Messages } from '@/shared/messages';
import { sectionOf, type SectionId } from '@/shared/sections';
import type { WorksheetContent } from '@/shared/worksheet';

type Options = Parameters<typeof contentFacts>[1];

/** One answer that two contents do not share, in words; an absent side was not answered there. */
export interface FactDifference {
  path: string;
  section: SectionId;
  /** The row it belongs to: "3.1 Normal branch circuit", "Maya Ortiz". */
  heading?: string;
  label: string;
  before?: string;
  after?: string;
}

interface Told {
  fact: ContentFact;
  group: FactGroup;
}

function told(content: WorksheetContent, options: Options): Told[] {
  return contentFacts(content, options).flatMap((group) =>
    group.facts.map((fact) => ({ fact, group })),
  );
}

const isUnder = (path: string, top: string) => path === top || path.startsWith(`${top}/`);

/**
 * The path of the same field in the earlier content: rows that carry an `id`
 * may stand at another place there. Undefined where the row is new.
 */
function pathBefore(path: string, before: unknown, after: unknown): string | undefined {
  let earlier = before;
  let later = after;
  let result = '';
  for (const step of path.split('/').slice(1)) {
    let key = step;
    if (Array.isArray(later) && Array.isArray(earlier)) {
      const row: unknown = later[Number(step)];
      const id = typeof row === 'object' && row !== null && 'id' in row ? row.id : undefined;
      if (typeof id === 'string') {
        const at = earlier.findIndex(
          (each: unknown) =>
            typeof each === 'object' && each !== null && 'id' in each && each.id === id,
        );
        if (at < 0) return undefined;
        key = String(at);
      }
    }
    result += `/${key}`;
    earlier = (earlier as Record<string, unknown> | undefined)?.[key];
    later = (later as Record<string, unknown> | undefined)?.[step];
  }
  return result;
}

function pairUp(
  was: readonly Told[],
  is: readonly Told[],
  movedTo: (path: string) => string | undefined,
) {
  const left = new Map(was.map((each) => [each.fact.path, each]));
  const pairs = is.map((after) => {
    const path = movedTo(after.fact.path);
    const before = path === undefined ? undefined : left.get(path);
    if (path !== undefined) left.delete(path);
    return { before, after };
  });
  return [...pairs, ...[...left.values()].map((before) => ({ before, after: undefined }))];
}

/**
 * What changed from one content to another, answer by answer in words and in
 * the order of the worksheet. A change that words cannot tell (an id behind a
 * name) is still listed.
 */
export function factDifferences(
  before: WorksheetContent,
  after: WorksheetContent,
  options: Options,
  words: Messages['trail'],
): FactDifference[] {
  const was = told(before, options);
  const is = told(after, options);
  return differences(before, after).flatMap((difference): FactDifference[] => {
    const gone = !('after' in difference);
    const earlierPath = gone ? difference.path : pathBefore(difference.path, before, after);
    const wasHere =
      earlierPath === undefined ? [] : was.filter(({ fact }) => isUnder(fact.path, earlierPath));
    const isHere = gone ? [] : is.filter(({ fact }) => isUnder(fact.path, difference.path));
    const movedTo = (path: string) =>
      earlierPath === undefined ? undefined : earlierPath + path.slice(difference.path.length);
    const pairs = pairUp(wasHere, isHere, movedTo);
    if (pairs.length === 0) {
      const { path } = difference;
      const label = fieldLabel(options.locale, path) ?? path;
      const section = sectionOf({ code: '', path });
      return [{ path, section, label, after: words.otherEntry }];
    }
    return pairs.map((pair) => {
      const { fact, group } = pair.after ?? pair.before;
      return {
        path: fact.path,
        section: group.section,
        heading: group.heading,
        label: fact.label,
        before: pair.before?.fact.value,
        after: pair.after?.fact.value,
      };
    });
  });
}
