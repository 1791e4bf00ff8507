import { z } from 'zod';
import type { Locale, Units } from './user';
import * as format from './format';
import { itemWords, messages, type Messages } from './messages/index';
import { sectionOf, type SectionId } from './sections';
import { date, dateTime } from './text';
import { closeOutSchema, worksheetContentSchema } from './worksheet';

/** One answered field in words. */
export interface ContentFact {
  /** JSON Pointer into the content. */
  path: string;
  label: string;
  value: string;
}

/** The answered fields of one row (a source, a person) or of what stands outside any row. */
export interface FactGroup {
  section: SectionId;
  /** "3.1 Normal branch circuit", "Maya Ortiz"; absent outside a list. */
  heading?: string;
  facts: ContentFact[];
}

interface Options {
  locale: Locale;
  units: Units;
  timeZone: string;
  /** Name of a site by its id; the id itself where it is not known. */
  siteName?: string;
}

type Group = keyof Messages['enumerations'];

const GROUP_OF: Readonly<Record<string, Group>> = {
  'job.task': 'task',
  'job.special': 'special',
  'job.lamps': 'lamps',
  'supply.system': 'system',
  'supply.exposure': 'exposure',
  'supply.switching': 'switching',
  'supply.neutralShared': 'neutralShared',
  'supply.tripped': 'tripped',
  'supply.conductorColors': 'conductorColor',
  egressSupply: 'egressSupply',
  egressReaches: 'egressReaches',
  'sources.kind': 'sourceKind',
  'sources.system': 'system',
  'sources.openedAt': 'openedAt',
  'sources.held': 'held',
  'sources.extraMeasure': 'extraMeasure',
  'decision.mode': 'mode',
  'decision.reason': 'reason',
  'decision.hazard': 'hazard',
  'decision.infeasibleBecause': 'infeasibleBecause',
  'decision.temporaryLight': 'temporaryLight',
  'absenceTest.instrument': 'instrument',
  'absenceTest.category': 'category',
  'arcFlash.task': 'arcFlashTask',
  'arcFlash.equipment': 'arcFlashEquipment',
  'protectiveEquipment.gloves.gloveClass': 'gloveClass',
  'crew.gloves.gloveClass': 'gloveClass',
  'surroundings.groundedSurfaces.kind': 'surfaceKind',
  'surroundings.access': 'access',
  'surroundings.ladder.material': 'ladderMaterial',
  'surroundings.ceiling': 'ceiling',
  'surroundings.overheadLines': 'overheadLines',
  'crew.closest': 'closest',
};

/** Ids that say nothing to a person. */
const UNSPOKEN = new Set([
  'sources.id',
  'crew.id',
  'crew.userId',
  'protectiveEquipment.rubberGoodsId',
]);
/** Fields that hold ids of crew members, and the one that holds the id of a source. */
const CREW_IDS = new Set(['sources.byCrewId', 'sources.lockedBy', 'absenceTest.byCrewId']);

const UNIT_OF: Readonly<Record<string, (locale: Locale, value: number, units: Units) => string>> = {
  'supply.circuitVolts': format.volts,
  'supply.workVolts': format.volts,
  'supply.watts': format.watts,
  'supply.readings.phaseToPhase': format.reading,
  'supply.readings.phaseToNeutral': format.reading,
  'absenceTest.ratedVolts': format.volts,
  'arcFlash.workingDistanceInches': (_, value, units) => format.typedDistance(value, units),
  'arcFlash.availableFaultKiloamperes': format.kiloamperes,
  'arcFlash.clearingSeconds': format.seconds,
  'arcFlash.clothingRatingCalPerCm2': format.calories,
  'arcFlash.label.systemVolts': format.volts,
  'arcFlash.label.incidentEnergyCalPerCm2': format.calories,
  'arcFlash.label.minimumArcRatingCalPerCm2': format.calories,
  'arcFlash.label.workingDistanceInches': (_, value, units) => format.typedDistance(value, units),
  'arcFlash.label.arcFlashBoundaryInches': (_, value, units) => format.typedDistance(value, units),
  'arcFlash.transformer.kilovoltAmperes': (locale, value) => format.quantity(locale, value, 'kVA'),
  'arcFlash.transformer.secondaryVolts': format.volts,
  'arcFlash.transformer.impedancePercent': (locale, value) => format.quantity(locale, value, '%'),
  'surroundings.ladder.sizeFeet': (_, value, units) => format.typedFeet(value, units),
  'surroundings.ladder.standingLevelFeet': (_, value, units) => format.typedFeet(value, units),
  'surroundings.ceilingHeightFeet': (_, value, units) => format.typedFeet(value, units),
  'surroundings.barricadeInches': (_, value, units) => format.typedDistance(value, units),
  'closeOut.egressTestedSeconds': format.seconds,
};

/** The rows that other answers name. */
interface Rows {
  sources?: readonly { id?: string; kind?: string }[];
  crew?: readonly { id?: string; name?: string }[];
}

class Teller {
  private readonly words: Messages;
  private readonly sources: NonNullable<Rows['sources']>;
  private readonly crew: NonNullable<Rows['crew']>;

  constructor(
    { sources = [], crew = [] }: Rows,
    private readonly options: Options,
  ) {
    this.words = messages(options.locale);
    this.sources = sources;
    this.crew = crew;
  }

  private enumWord(group: Group, value: string): string {
    const list: Readonly<Record<string, string>> = this.words.enumerations[group];
    return list[value] ?? value;
  }

  /** The words of one value at one place; a value that cannot be shown is shown as it stands. */
  value(key: string, value: unknown): string {
    const { locale, units, timeZone, siteName } = this.options;
    if (Array.isArray(value)) {
      if (value.length === 0) return this.words.ui.none;
      return value.map((item) => this.value(key, item)).join(', ');
    }
    if (typeof value === 'boolean') return value ? this.words.ui.yes : this.words.ui.no;
    if (typeof value === 'number') {
      return UNIT_OF[key]?.(locale, value, units) ?? format.number(locale, value);
    }
    const text = String(value);
    if (key === 'job.siteId') return siteName ?? text;
    if (CREW_IDS.has(key)) return this.crew.find(({ id }) => id === text)?.name ?? text;
    if (key === 'sources.sameConductorsAs') return this.sourceName(text);
    if (key === 'protectiveEquipment.ready') return this.itemName(text);
    if (key === 'briefing.topics') return this.topicName(text);
    // Never `Date.parse`: it takes an AED on "Floor 2" for a day in February.
    if (/(At|validUntil)$/.test(key) && dateTime.safeParse(text).success) {
      return format.dateTimeText(locale, text, timeZone);
    }
    if (/(On|Through)$/.test(key) && date.safeParse(text).success) {
      return format.dateText(locale, text);
    }
    const group = GROUP_OF[key];
    return group === undefined ? text : this.enumWord(group, text);
  }

  private itemName(id: string): string {
    // The list is free text to a client: only what has a name of ours is filled in like one.
    if (!Object.hasOwn(this.words.items, id)) return id;
    return itemWords(this.options.locale, { id, params: {} });
  }

  private topicName(topic: string): string {
    const topics: Readonly<Record<string, { name: string }>> = this.words.topics;
    return topics[topic]?.name ?? topic;
  }

  private sourceName(id: string): string {
    const index = this.sources.findIndex((source) => source.id === id);
    return index < 0 ? id : this.sourceHeading(index);
  }

  private sourceHeading(index: number): string {
    const kind = this.sources[index]?.kind;
    return kind === undefined
      ? `3.${index + 1}`
      : `3.${index + 1} ${this.enumWord('sourceKind', kind)}`;
  }

  /** What stands over a row of its own; undefined where the rows stay with what is around them. */
  rowHeading(key: string, index: number): string | undefined {
    if (key === 'sources') return this.sourceHeading(index);
    if (key === 'crew') return this.crew[index]?.name ?? `${index + 1}`;
    return undefined;
  }

  label(key: string): string {
    const labels: Readonly<Record<string, string>> = this.words.fields;
    return labels[key] ?? key;
  }
}

function shapeOf(schema: unknown): Record<string, unknown> | undefined {
  let inner = schema;
  while (inner instanceof z.ZodOptional) inner = inner.unwrap();
  if (inner instanceof z.ZodObject) return inner.shape;
  return undefined;
}

function elementOf(schema: unknown): unknown {
  let inner = schema;
  while (inner instanceof z.ZodOptional) inner = inner.unwrap();
  return inner instanceof z.ZodArray ? inner.element : undefined;
}

interface Place {
  schema: unknown;
  value: unknown;
  key: string;
  path: string;
}

function collect(place: Place, group: FactGroup, groups: FactGroup[], teller: Teller): void {
  const { schema, value, key, path } = place;
  if (value === undefined || UNSPOKEN.has(key)) return;
  const shape = shapeOf(schema);
  if (shape !== undefined && typeof value === 'object' && value !== null) {
    const fields = value as Record<string, unknown>;
    for (const [name, inner] of Object.entries(shape)) {
      const next = {
        schema: inner,
        value: fields[name],
        key: `${key}.${name}`,
        path: `${path}/${name}`,
      };
      collect(next, group, groups, teller);
    }
    return;
  }
  const element = elementOf(schema);
  if (element !== undefined && shapeOf(element) !== undefined && Array.isArray(value)) {
    if (value.length === 0)
      group.facts.push({ path, label: teller.label(key), value: teller.value(key, value) });
    value.forEach((row: unknown, index) => {
      const heading = teller.rowHeading(key, index);
      const own: FactGroup =
        heading === undefined ? group : { section: group.section, heading, facts: [] };
      collect({ schema: element, value: row, key, path: `${path}/${index}` }, own, groups, teller);
      if (own !== group && own.facts.length > 0) groups.push(own);
    });
    return;
  }
  group.facts.push({ path, label: teller.label(key), value: teller.value(key, value) });
}

/**
 * Every answered field of a content in words, in the order of the worksheet.
 * A field of the schema can never be missing here: the walk follows the schema.
 */
export function contentFacts(content: unknown, options: Options): FactGroup[] {
  const teller = new Teller(content as Rows, options);
  const groups: FactGroup[] = [];
  for (const [key, schema] of Object.entries(worksheetContentSchema.shape)) {
    const group: FactGroup = { section: sectionOf({ code: '', path: `/${key}` }), facts: [] };
    const rows: FactGroup[] = [];
    const value = (content as Record<string, unknown>)[key];
    collect({ schema, value, key, path: `/${key}` }, group, rows, teller);
    if (group.facts.length > 0) groups.push(group);
    groups.push(...rows);
  }
  return groups;
}

/** Every answered field of a close-out in words. */
export function closeOutFacts(closeOut: unknown, options: Options): ContentFact[] {
  const group: FactGroup = { section: 'closeOut', facts: [] };
  const teller = new Teller({}, options);
  collect(
    { schema: closeOutSchema, value: closeOut, key: 'closeOut', path: '/closeOut' },
    group,
    [],
    teller,
  );
  return group.facts;
}
