import { nfpa70e2024 } from './editions';
import type { Edition, EditionCitationId } from './editions/types';
import type { Citation, Confidence } from './types';

const osha = (table: string, confidence: Confidence = 'regulation'): Citation => ({
  standard: 'OSHA 29 CFR 1910',
  edition: 'in force',
  table,
  confidence,
});
const construction = (table: string): Citation => ({
  standard: 'OSHA 29 CFR 1926',
  edition: 'in force',
  table,
  confidence: 'regulation',
});
const nec = (table: string, confidence: Confidence): Citation => ({
  standard: 'NFPA 70 (NEC)',
  edition: '2023',
  table,
  confidence,
});
const lifeSafety = (table: string): Citation => ({
  standard: 'NFPA 101',
  edition: '2024',
  table,
  confidence: 'agreeing',
});
const face = (table: string): Citation => ({
  standard: 'NIOSH FACE',
  edition: 'public report',
  table,
  confidence: 'single',
});
const practice = (table: string): Citation => ({
  standard: 'Common practice',
  edition: '1',
  table,
  confidence: 'common practice',
});
const own = (table: string): Citation => ({
  standard: 'Wideberth',
  edition: '1',
  table,
  confidence: 'own policy',
});

/**
 * Every clause that a rule or a table rests on and that does not move with an
 * edition of NFPA 70E. `confidence` says how the clause was checked, not how
 * weighty it is.
 */
const commonCitations = {
  'osha1910.23(c)': osha('1910.23(c)', 'memory'),
  'osha1910.37': osha('1910.37(a)(4), (b)(1), (d)(2)'),
  'osha1910.67(c)(2)': osha('1910.67(c)(2)(ii), (v)'),
  'osha1910.137': osha('1910.137'),
  'osha1910.137(c)(2)(ii)': osha('1910.137(c)(2)(ii)'),
  'osha1910.137(c)(2)(vii)': osha('1910.137(c)(2)(vii)'),
  'osha1910.137.tableI-4': osha('1910.137 Table I-4'),
  'osha1910.137.tableI-5': osha('1910.137 Table I-5'),
  'osha1910.147(a)(2)(iii)(A)': osha('1910.147(a)(2)(iii)(A)'),
  'osha1910.147(f)(3)(ii)(D)': osha('1910.147(f)(3)(ii)(D), 1910.333(b)(2) Note 2'),
  'osha1910.147(f)(4)': osha('1910.147(f)(4)'),
  'osha1910.151(b)': osha('1910.151(b)', 'memory'),
  'osha1910.307': osha('1910.307'),
  'osha1910.332(b)(3)': osha('1910.332(b)(3)'),
  'osha1910.333(a)(1)': osha('1910.333(a)(1)'),
  'osha1910.333(a)(1).note1': osha('1910.333(a)(1) Note 1'),
  'osha1910.333(a)(1).note2': osha('1910.333(a)(1) Note 2'),
  'osha1910.333(a)(2)': osha('1910.333(a)(2)'),
  'osha1910.333(b)(1)': osha('1910.333(b)(1)'),
  'osha1910.333(b)(2)(i)': osha('1910.333(b)(2)(i)'),
  'osha1910.333(b)(2)(ii)': osha('1910.333(b)(2)(ii)'),
  'osha1910.333(b)(2)(ii)(B)': osha('1910.333(b)(2)(ii)(B)'),
  'osha1910.333(b)(2)(ii)(C)': osha('1910.333(b)(2)(ii)(C)'),
  'osha1910.333(b)(2)(iii)': osha('1910.333(b)(2)(iii)(A), (C), (D), (E)'),
  'osha1910.333(b)(2)(iii)(E)(2)': osha('1910.333(b)(2)(iii)(E)(2)'),
  'osha1910.333(b)(2)(iv)(A)': osha('1910.333(b)(2)(iv)(A)'),
  'osha1910.333(b)(2)(iv)(B)': osha('1910.333(b)(2)(iv)(B)'),
  'osha1910.333(b)(2)(v)': osha('1910.333(b)(2)(v)'),
  'osha1910.333(b)(2)(v)(A)': osha('1910.333(b)(2)(v)(A)'),
  'osha1910.333(b)(2)(v)(B)': osha('1910.333(b)(2)(v)(B)'),
  'osha1910.333(b)(2)(v)(C)': osha('1910.333(b)(2)(v)(C)'),
  'osha1910.333(b)(2)(v)(D)': osha('1910.333(b)(2)(v)(D)'),
  'osha1910.333(c)': osha('1910.333(c)'),
  'osha1910.333(c)(2)': osha('1910.333(c)(2)'),
  'osha1910.333(c)(3)': osha('1910.333(c)(3)(i), (iii)'),
  'osha1910.333(c)(4)': osha('1910.333(c)(4)(i), (ii)'),
  'osha1910.333(c)(7)': osha('1910.333(c)(7)'),
  'osha1910.333(c)(8)': osha('1910.333(c)(8)'),
  'osha1910.334(a)(4)': osha('1910.334(a)(4)'),
  'osha1910.334(b)(2)': osha('1910.334(b)(2)'),
  'osha1910.334(c)(1)': osha('1910.334(c)(1)'),
  'osha1910.334(c)(2)': osha('1910.334(c)(2)'),
  'osha1910.334(c)(3)': osha('1910.334(c)(3)'),
  'osha1910.334(d)': osha('1910.334(d)'),
  'osha1910.335(a)(1)': osha('1910.335(a)(1)'),
  'osha1910.335(a)(2)': osha('1910.335(a)(2)'),
  'osha1910.335(a)(2)(ii)': osha('1910.335(a)(2)(ii)'),
  'osha1910.335(b)(2)': osha('1910.335(b)(2)'),
  'osha1910.335(b)(3)': osha('1910.335(b)(3)'),
  'osha1910.399.note2': osha('1910.399 Note 2'),
  'osha1910.1001(j)': osha('1910.1001(j)'),
  'osha1926.416(a)': construction('1926.416(a)'),
  'osha1926.417': construction('1926.417'),
  'osha1926.1053(b)(6)': construction('1926.1053(b)(6), (8)'),
  'osha1926.1053(b)(12)': construction('1926.1053(b)(12)'),
  'osha1926.1053(b)(13)': construction('1926.1053(b)(13)'),
  osha3075: {
    standard: 'OSHA 3075',
    edition: '2002',
    table: 'Effects of electric current in the human body',
    confidence: 'regulation',
  },
  epa40cfr761: {
    standard: 'EPA 40 CFR 761',
    edition: 'in force',
    table: '761',
    confidence: 'agreeing',
  },
  'nec110.15': nec('110.15', 'memory'),
  'nec210.4(B)': nec('210.4(B)', 'regulation'),
  'nec210.5(C)': nec('210.5(C)', 'regulation'),
  'nec300.13(B)': nec('300.13(B)', 'memory'),
  nec700: nec('Article 700', 'agreeing'),
  'nec700.5': nec('700.5', 'memory'),
  'nec700.12': nec('700.12', 'agreeing'),
  'nec700.26': nec('700.26', 'agreeing'),
  'nfpa101.7.9': lifeSafety('7.9'),
  'nfpa101.7.9.3': lifeSafety('7.9.3'),
  ansiC84: {
    standard: 'ANSI C84.1',
    edition: '2020',
    table: 'Table 1, range B',
    confidence: 'memory',
  },
  iec61010: {
    standard: 'IEC 61010-2-030',
    edition: '2010',
    table: 'Measurement categories',
    confidence: 'agreeing',
  },
  iec60479: {
    standard: 'IEC 60479-1',
    edition: '2018',
    table: 'Table 1',
    confidence: 'memory',
  },
  ulLampholders: {
    standard: 'UL notices',
    edition: '2010, 2018',
    table: 'Double-ended lamps',
    confidence: 'agreeing',
  },
  infiniteBus: {
    standard: 'Transformer nameplate arithmetic',
    edition: '1',
    table: 'Infinite bus',
    confidence: 'agreeing',
  },
  face04WA080: face('04WA080'),
  'face86-35': face('86-35'),
  'face87-55': face('87-55'),
  'face95-NJ-080': face('95-NJ-080'),
  face94MD022: face('94MD022'),
  face92NJ007: face('92NJ007'),
  'practice.systemVolts': practice('Nominal voltages of a system'),
  'practice.conductorColors': practice('Conductor colors'),
  'practice.egressSupply': practice('Supplies of emergency lighting'),
  'practice.batteryUnit': practice('Battery units'),
  'practice.travelers': practice('Travelers'),
  'practice.neutral': practice('Shared neutrals'),
  'practice.controls': practice('Lighting controls'),
  'practice.strayVoltage': practice('Stray voltage'),
  'practice.directCurrent': practice('Direct current'),
  'practice.groundedSurfaces': practice('Grounded surfaces'),
  'practice.stepladder': practice('Stepladder reach'),
  'practice.ladderPlaced': practice('Ladder placement'),
  'practice.loadCurrent': practice('Load current'),
  'own.scope': own('Scope'),
  'own.switchIsNoIsolation': own('Wall switches and control devices'),
  'own.batteryConnector': own('Battery connector under exclusive control'),
  'own.qualifiedOpens': own('Who opens and locks'),
  'own.outageAsked': own('Outage asked for'),
  'own.permitApprover': own('Who approves a permit'),
  'own.leatherProtectors': own('Leather protectors always'),
  'own.escort': own('Who may escort'),
  'own.aboveForty': own('Above 40 cal/cm²'),
  'own.alone': own('Working alone'),
  'own.window': own('Length of a worksheet'),
  'own.complete': own('Questions that must be answered'),
  'own.egressTest': own('Test of emergency lighting'),
} as const satisfies Record<string, Citation>;

export type CitationId = keyof typeof commonCitations | EditionCitationId;

/** The ids of this file: a test checks that each is well formed. */
export const COMMON_CITATION_IDS = Object.keys(commonCitations) as (keyof typeof commonCitations)[];

const isCommon = (id: CitationId): id is keyof typeof commonCitations =>
  Object.hasOwn(commonCitations, id);

/**
 * The clause behind an id, as a copy that the caller may keep. The numbers of
 * NFPA 70E move between editions, so those are read from the edition.
 */
export function citation(id: CitationId, edition: Edition = nfpa70e2024): Citation {
  return { ...(isCommon(id) ? commonCitations[id] : edition.citations[id]) };
}
