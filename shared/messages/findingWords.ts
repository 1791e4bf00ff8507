import type { Finding, RequiredItem } from '@/hazard/types';
import { dateText, list } from '../format';
import type { Locale, Units } from '../user';
import { enumWord, isEnumGroup } from './enumWord';
import { messages, type Messages } from './languages';
import { figure, fill, lowerFirst, noBreak, type Resolve, type Value } from './template';

type Params = Readonly<Record<string, string | number>>;
/** What of a finding its words rest on. */
type Said = Pick<Finding, 'code' | 'severity' | 'path' | 'params'>;
type Entry = Readonly<Record<string, string>>;

const DATE = /^\d{4}-\d{2}-\d{2}$/;
const CONDUCTOR = /^[A-G]$|^N$/;

/** The section of the worksheet that holds a top-level key of the content. */
const SECTION_NUMBERS: Readonly<Record<string, number>> = {
  job: 1,
  supply: 2,
  sources: 3,
  egressSupply: 3,
  egressReaches: 3,
  egress: 3,
  decision: 4,
  absenceTest: 5,
  proof: 5,
  arcFlash: 7,
  protectiveEquipment: 8,
  surroundings: 9,
  crew: 10,
  briefing: 10,
  notes: 12,
  closeOut: 12,
};

function steps(path: string): string[] {
  return path.split('/').filter((step) => step !== '');
}

/** The number of the section that a finding's path leads to, 1 for a path that leads nowhere. */
export function sectionNumberOf(path: string): number {
  return SECTION_NUMBERS[String(steps(path)[0])] ?? 1;
}

/** The label of the field that a JSON Pointer leads to: `/sources/0/openedAt` is `Opened at`. */
export function fieldLabel(locale: Locale, path: string): string | null {
  const labels: Readonly<Record<string, string>> = messages(locale).fields;
  const key = steps(path)
    .filter((step) => !/^\d+$/.test(step))
    .join('.');
  return labels[key] ?? null;
}

const own = (text: string): Value => ({ text, isName: false });
const name = (text: string): Value => ({ text, isName: true });

function textOf(params: Params, ...keys: string[]): string | null {
  for (const key of keys) {
    const value = params[key];
    if (value !== undefined && value !== '') return String(value);
  }
  return null;
}

/** Reads a finding for its sentence: params first, then what the path says. */
class Reader {
  private readonly words: Messages;

  constructor(
    private readonly locale: Locale,
    private readonly units: Units,
    private readonly params: Params,
    private readonly path: string,
  ) {
    this.words = messages(locale);
  }

  readonly resolve: Resolve = (key, unit) => {
    switch (key) {
      case 'way':
        return this.way();
      case 'who':
        return this.who();
      case 'where':
        return this.path.startsWith('/crew') ? this.who() : this.wayOf(this.index('sources'));
      case 'point':
        return this.point();
      case 'pair':
        return this.pair();
      case 'item':
        return this.item();
      case 'topic':
        return this.topic();
      case 'field':
        return this.field();
      case 'section':
        return own(String(sectionNumberOf(this.path)));
      default:
        return this.plain(key, unit);
    }
  };

  readonly fallback = (key: string): string => {
    const words: Readonly<Record<string, unknown>> = this.words.common.fallback;
    const word = words[key];
    return typeof word === 'string' ? word : this.words.common.notKnown;
  };

  /** Position in a list: what `index` says, else the number in the path. */
  private index(section: string): number | null {
    const inPath = new RegExp(`^/${section}/(\\d+)`).exec(this.path);
    return inPath ? Number(inPath[1]) : null;
  }

  private way(): Value | null {
    const given = this.params['index'];
    return this.wayOf(typeof given === 'number' ? given : this.index('sources'));
  }

  private wayOf(index: number | null): Value | null {
    if (index === null) return null;
    const { kind, from } = this.params;
    const about = [
      typeof kind === 'string' ? lowerFirst(enumWord(this.locale, 'sourceKind', kind)) : '',
      typeof from === 'string' && !CONDUCTOR.test(from) ? from : '',
    ].filter((part) => part !== '');
    const numbered = this.words.common.fallback.way_number(index + 1);
    return own(about.length > 0 ? `${numbered} (${about.join(', ')})` : numbered);
  }

  private who(): Value | null {
    const given = textOf(this.params, 'name', 'who');
    if (given !== null) return name(given);
    const { index: position } = this.params;
    const isOfGloves = this.path.startsWith('/protectiveEquipment') && typeof position === 'number';
    const index = isOfGloves ? position : this.index('crew');
    return index === null ? null : own(this.words.common.fallback.person_number(index + 1));
  }

  private point(): Value | null {
    const { point, number } = this.params;
    if (typeof point === 'string' && point !== '') return name(point);
    return typeof number === 'number' ? own(this.words.common.fallback.point_number(number)) : null;
  }

  private pair(): Value | null {
    const { from, to } = this.params;
    return typeof from === 'string' && typeof to === 'string'
      ? name(this.words.common.fallback.pair(from, to))
      : null;
  }

  private item(): Value | null {
    const id = textOf(this.params, 'item', 'id');
    return id === null ? null : own(itemWords(this.locale, { id, params: this.params }));
  }

  private topic(): Value | null {
    const id = textOf(this.params, 'topic');
    const topics: Readonly<Record<string, { readonly name: string }>> = this.words.topics;
    return id === null ? null : own(topics[id]?.name ?? id);
  }

  private field(): Value | null {
    const label = fieldLabel(this.locale, this.path);
    return label === null ? null : name(label);
  }

  private plain(key: string, unit: string | undefined): Value | null {
    const value = this.params[key];
    if (value === undefined || value === '') return null;
    if (typeof value === 'number') return name(figure(this.locale, value, unit, this.units));
    if (DATE.test(value)) return name(dateText(this.locale, value));
    const group = unit ?? key;
    if (!isEnumGroup(group)) return name(value);
    return own(
      list(
        this.locale,
        value.split(', ').map((each, i) => {
          const word = enumWord(this.locale, group, each);
          return i === 0 ? word : lowerFirst(word);
        }),
      ),
    );
  }
}

/**
 * The sentence of a severity. Where one rule asks for several things it has one
 * for each limit that was passed, for what is not answered, or for each field
 * that it leads to. A finding is never without a sentence.
 */
function sentenceOf(entry: Entry, words: Messages, finding: Said): string {
  const { severity, path, params } = finding;
  const field = steps(path)
    .filter((step) => !/^\d+$/.test(step))
    .at(-1);
  return (
    entry[`${severity}:${String(params['limit'])}`] ??
    (params['field'] === undefined ? undefined : entry[`${severity}:unanswered`]) ??
    entry[`${severity}/${String(field)}`] ??
    entry[severity] ??
    (severity === 'open' ? words.findings.unanswered.open : words.common.fallback.sentence)
  );
}

export interface FindingWords {
  title: string;
  /** What is so and what to do, in one or two sentences. */
  text: string;
}

/**
 * A finding in words: a title for lists, and a sentence that says what is so and
 * then what to do. Params that the finding does not carry leave no hole.
 */
export function findingWords(locale: Locale, finding: Said, units: Units = 'feet'): FindingWords {
  const words = messages(locale);
  const { unanswered, ...rules }: Readonly<Record<string, Entry>> = words.findings;
  const entry = finding.code.endsWith('.unanswered') ? unanswered : rules[finding.code];
  const reader = new Reader(locale, units, finding.params, finding.path);
  const sentence = entry ? sentenceOf(entry, words, finding) : words.common.fallback.sentence;
  return {
    title: entry?.['title'] ?? finding.code,
    text: noBreak(fill(sentence, reader.resolve, reader.fallback)),
  };
}

/** The name of a required piece of equipment, with the class, rating or category asked for. */
export function itemWords(
  locale: Locale,
  item: Pick<RequiredItem, 'id' | 'params'>,
  units: Units = 'feet',
): string {
  const words: Readonly<Record<string, string>> = messages(locale).items;
  const reader = new Reader(locale, units, item.params, '');
  return noBreak(fill(words[item.id] ?? item.id, reader.resolve, reader.fallback));
}
