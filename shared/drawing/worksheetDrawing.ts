import type { CrewMember, WorksheetContent } from '@/hazard/content';
import type { Assessment } from '@/hazard/types';
import { distancePair, typedFeet, volts } from '../format';
import type { Messages } from '../messages';
import type { Locale, Units } from '../user';
import type { SectionInput, SectionPeople } from './sectionTypes';
import { boundariesOrMessage, zonesOf, type ZoneSet } from './zones';

export interface DrawingSubject {
  content: WorksheetContent;
  assessment: Pick<Assessment, 'boundaries' | 'arcFlash' | 'barricade'>;
  messages: Messages;
  locale: Locale;
  units: Units;
}

export function zonesOfWorksheet({ assessment, messages, units }: DrawingSubject): ZoneSet {
  return zonesOf({ assessment, units, words: messages.drawing.zones });
}

/** Work whose exposed part is in a panel on the wall rather than at the ceiling. */
function placeOf({ job, arcFlash }: WorksheetContent): SectionInput['place'] {
  const atPanel = job?.task === 'work in panelboard' || job?.task === 'replace breaker';
  const equipment = arcFlash?.equipment;
  const isCabinet =
    equipment === 'panelboard' ||
    equipment === 'motor control center' ||
    equipment === 'switchboard' ||
    equipment === 'disconnect' ||
    equipment === 'transformer';
  return atPanel || isCabinet ? 'panel' : 'ceiling';
}

/**
 * How close a person is drawn. Whoever tests comes inside the restricted
 * boundary whatever is answered, and so does a lead who has not answered;
 * nobody is ever drawn farther away than they may be.
 */
function closestOf(member: CrewMember, content: WorksheetContent): SectionPeople['closest'] | null {
  const { absenceTest, decision, job } = content;
  const tests =
    absenceTest?.byCrewId !== undefined &&
    member.id === absenceTest.byCrewId &&
    (decision?.mode !== 'energized' || job?.task === 'test or troubleshoot');
  if (tests) return 'restricted';
  return member.closest ?? (member.lead ? 'restricted' : null);
}

function peopleOf({ content, messages }: DrawingSubject): SectionPeople[] {
  const groups = new Map<SectionPeople['closest'], { lead: boolean; helpers: number }>();
  for (const member of content.crew ?? []) {
    const closest = closestOf(member, content);
    if (closest === null) continue;
    // With or without an escort they stand in the same place.
    const key = closest === 'limited with escort' ? 'limited' : closest;
    const group = groups.get(key) ?? { lead: false, helpers: 0 };
    if (member.lead) group.lead = true;
    else group.helpers += 1;
    groups.set(key, group);
  }
  const words = messages.drawing;
  return [...groups].map(([closest, { lead, helpers }]) => ({
    closest,
    label:
      lead && helpers > 0
        ? words.and(words.lead, words.helpers(helpers))
        : lead
          ? words.lead
          : words.helpers(helpers),
  }));
}

/** A height as people say it: whole feet without the inches, `9 ft`. */
function heightText(feet: number, units: Units): string {
  return typedFeet(feet, units).replace(/\u00a00\u00a0in$/, '');
}

function accessWords({ content, messages, units }: DrawingSubject): string[] {
  const { access, ladder } = content.surroundings ?? {};
  const { enumerations, drawing } = messages;
  if (access === undefined || access === 'floor') return [];
  if (access !== 'stepladder') return [enumerations.access[access]];
  const material = ladder?.material && enumerations.ladderMaterial[ladder.material];
  const size = ladder?.sizeFeet && heightText(ladder.sizeFeet, units);
  const level = ladder?.standingLevelFeet;
  const what = material ?? enumerations.access.stepladder;
  const first = size ? drawing.sized(what, size) : what;
  return level === undefined ? [first] : [first, drawing.standingAt(heightText(level, units))];
}

/** What the section drawing of a worksheet shows. */
export function sectionInputOf(
  subject: DrawingSubject,
  { width, pixelsPerFoot, medium }: Pick<SectionInput, 'width' | 'pixelsPerFoot' | 'medium'>,
): SectionInput {
  const { content, messages, units } = subject;
  const { ceilingHeightFeet, groundedSurfaces, access, ladder } = content.surroundings ?? {};
  const grounded = (groundedSurfaces ?? []).flatMap(({ kind, inReach }) =>
    // Not answered counts as in reach.
    kind === undefined || inReach === false
      ? []
      : [{ kind, label: messages.enumerations.surfaceKind[kind] }],
  );
  const hasGrid = grounded.some(({ kind }) => kind === 'ceiling grid');
  const height =
    ceilingHeightFeet !== undefined && ceilingHeightFeet > 0 ? ceilingHeightFeet : null;
  const words = messages.drawing;
  return {
    zones: zonesOfWorksheet(subject),
    units,
    width,
    pixelsPerFoot,
    medium,
    place: placeOf(content),
    ceilingHeightFeet: height,
    access: access ?? null,
    ladderSizeFeet: ladder?.sizeFeet ?? null,
    standingLevelFeet: ladder?.standingLevelFeet ?? null,
    grounded,
    people: peopleOf(subject),
    words: {
      exposedPart: words.exposedPart,
      ceiling:
        height === null
          ? words.ceilingNotKnown
          : (hasGrid ? words.grid : words.ceiling)(heightText(height, units)),
      access: accessWords(subject),
    },
  };
}

/** The voltage that the distances were taken for: `480 V phase-to-phase, from 277 V`. */
export function voltageLine({ assessment, content, messages, locale }: DrawingSubject): {
  volts: string | null;
  rest: string;
} {
  const { boundaries } = assessment;
  if (!boundaries) return { volts: null, rest: messages.drawing.voltsNotKnown };
  const figure = volts(locale, boundaries.volts);
  const circuitVolts = content.supply?.circuitVolts;
  const differs = circuitVolts !== undefined && circuitVolts !== boundaries.volts;
  const whole = differs
    ? messages.drawing.voltsFrom(figure, volts(locale, circuitVolts))
    : messages.drawing.volts(figure);
  return { volts: figure, rest: whole.replace(figure, '').trim() };
}

/**
 * Strip and drawing in words, one sentence a boundary: what a screen reader
 * says, and the same that the PDF lists. A distance has both published figures.
 */
export function distanceLines(subject: DrawingSubject): string[] {
  const { assessment, messages, units } = subject;
  const words = messages.drawing;
  const boundaries = boundariesOrMessage({ assessment, words: words.zones });
  if (typeof boundaries === 'string') return [`${boundaries}.`];
  const { arcFlashNote } = zonesOfWorksheet(subject);
  const { arcFlash, barricade } = assessment;
  const lines: string[] = [];
  const { restricted } = boundaries;
  if (restricted !== null) {
    const figure =
      restricted === 'avoid contact' ? words.zones.avoidContact : distancePair(restricted, units);
    lines.push(words.line(words.restrictedFull, figure));
  }
  const limited = boundaries.movable ? boundaries.limitedMovable : boundaries.limitedFixed;
  if (limited) {
    const name = boundaries.movable ? words.limitedMovableFull : words.limitedFixedFull;
    lines.push(words.line(name, distancePair(limited, units)));
  }
  if (arcFlash.arcFlashBoundary) {
    lines.push(words.line(words.arcFlashFull, distancePair(arcFlash.arcFlashBoundary, units)));
  } else {
    lines.push(arcFlashNote === null ? words.arcFlashNone : `${arcFlashNote}.`);
  }
  if (barricade && barricade.inches > 0) {
    lines.push(words.line(words.barricadeFull, distancePair(barricade, units)));
  }
  return lines;
}
