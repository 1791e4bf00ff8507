import { describe, expect, it } from 'vitest';
import { z } from 'zod';
import * as hazard from '@/hazard';
import { PERMIT_EXEMPTIONS, PERMIT_REASONS } from '@/hazard/engine/permit';
import { REQUIRED_ITEM_IDS } from '@/hazard/engine/items';
import { COMMON_CITATION_IDS } from '@/hazard/citations';
import { rules as hazardRules } from '@/hazard/rules';
import { PROBLEMS } from '@/shared/problem';
import * as record from '@/shared/record';
import * as register from '@/shared/register';
import * as user from '@/shared/user';
import { closeOutSchema, proofSchema, worksheetContentSchema } from '@/shared/worksheet';
import { en } from '@/shared/messages/en/index';
import { es } from '@/shared/messages/es/index';
import { figure } from '@/shared/messages/template';
import {
  citationPlace,
  citationWords,
  enumWord,
  fieldLabel,
  findingWords,
  FIRST_USE_ITEMS,
  itemWords,
  messages,
  sectionNumberOf,
} from '@/shared/messages';

const LOCALES = user.LOCALES;
type Severity = hazard.Severity;

/** What the functions among the words are tried with: counts, names, flags and the caution's blanks. */
const SAMPLES: readonly unknown[][] = [
  [2, 2, 2, 2],
  [1, 1, 1, 1],
  [0, 1, 0, 1],
  [1, 0, 1, 0],
  ['X', 'X', 'X', 'X'],
  ['X', 1, 'X', 1],
  ['X', 2, 'X', 2],
  [true, true, true, true],
  ['', '', '', ''],
  [{ editions: 'E', contact: '911', place: 'D' }],
  [['X', 'X']],
];

/** Every text in a set of words, with functions called, by its path. */
function textsOf(words: unknown, path = ''): [string, string][] {
  if (typeof words === 'string') return [[path, words]];
  if (typeof words === 'function') {
    const write = words as (...args: unknown[]) => unknown;
    return SAMPLES.flatMap((args) => {
      try {
        const texts = textsOf(write(...args), path);
        const hasHole = /undefined|NaN|true|\[object/;
        return args[0] === '' || texts.some(([, text]) => hasHole.test(text)) ? [] : texts;
      } catch {
        return []; // This function takes something else.
      }
    });
  }
  if (typeof words !== 'object' || words === null) return [];
  return Object.entries(words).flatMap(([key, value]) =>
    textsOf(value, path === '' ? key : `${path} > ${key}`),
  );
}

const english = textsOf(en);
const spanish = textsOf(es);

describe('coverage of every value', () => {
  const groups: Record<string, readonly string[]> = {
    system: hazard.SYSTEMS,
    task: hazard.JOB_TASKS,
    special: hazard.SPECIAL_CONDITIONS,
    lamps: hazard.LAMPS,
    exposure: hazard.EXPOSURES,
    switching: hazard.SWITCHINGS,
    neutralShared: hazard.NEUTRAL_SHARED,
    tripped: hazard.TRIPPED,
    conductorColor: hazard.CONDUCTOR_COLORS,
    egressSupply: hazard.EGRESS_SUPPLIES,
    egressReaches: hazard.EGRESS_REACHES,
    sourceKind: hazard.SOURCE_KINDS,
    openedAt: hazard.OPENED_AT,
    held: hazard.HELD,
    extraMeasure: hazard.EXTRA_MEASURES,
    mode: hazard.MODES,
    reason: hazard.REASONS,
    hazard: hazard.ADDITIONAL_HAZARDS,
    infeasibleBecause: hazard.INFEASIBLE_BECAUSE,
    temporaryLight: hazard.TEMPORARY_LIGHT,
    instrument: hazard.INSTRUMENTS,
    category: hazard.METER_CATEGORIES,
    meterLocation: hazard.METER_LOCATIONS,
    arcFlashTask: hazard.ARC_FLASH_TASKS,
    arcFlashEquipment: hazard.ARC_FLASH_EQUIPMENT,
    condition: hazard.EQUIPMENT_CONDITIONS,
    normal: hazard.NORMAL_CONDITIONS,
    gloveClass: hazard.GLOVE_CLASSES,
    surfaceKind: hazard.GROUNDED_SURFACE_KINDS,
    access: hazard.ACCESS,
    ladderMaterial: hazard.LADDER_MATERIALS,
    ceiling: hazard.CEILINGS,
    overheadLines: hazard.OVERHEAD_LINES,
    closest: hazard.CLOSEST,
    otherLiveParts: hazard.OTHER_LIVE_PARTS,
    storedEnergy: hazard.STORED_ENERGY,
    conductor: hazard.CONDUCTORS,
    current: [...hazard.CURRENTS, 'ac and dc'],
    state: record.STATES,
    meaning: record.MEANINGS,
    stopReason: record.STOP_REASONS,
    attachmentSection: record.ATTACHMENT_SECTIONS,
    role: user.ROLES,
    units: user.UNITS,
    theme: user.THEMES,
    locale: user.LOCALES,
    rubberGoodsKind: register.RUBBER_GOODS_KINDS,
    retiredBecause: register.RETIRED_BECAUSE,
    verdict: ['stop', 'open', 'ready'],
    severity: ['stop', 'open', 'caution'],
    stage: ['plan', 'work', 'close-out'],
    arcFlashMethod: ['not likely', 'incident energy', 'ppe category', 'study needed'],
    confidence: [
      'regulation',
      'agreeing',
      'single',
      'memory',
      'common practice',
      'own policy',
    ] satisfies hazard.Confidence[],
  };

  it.each(Object.keys(en.enumerations))('has a word for each value of %s and no more', (group) => {
    const words = en.enumerations[group as keyof typeof en.enumerations];
    expect(Object.keys(words).sort()).toEqual([...(groups[group] ?? [])].sort());
  });

  it('names every rule, and no code that no rule gives', () => {
    const codes = hazard.RULE_CODES.map((code) =>
      code.endsWith('.unanswered') ? 'unanswered' : code,
    );
    expect(Object.keys(en.findings).sort()).toEqual([...new Set(codes)].sort());
  });

  it('names every item, topic, reason of the permit and problem', () => {
    expect(Object.keys(en.items).sort()).toEqual([...REQUIRED_ITEM_IDS].sort());
    expect(Object.keys(en.topics)).toEqual([...hazard.BRIEFING_TOPICS]);
    expect(Object.keys(en.permit.because).sort()).toEqual([...PERMIT_REASONS].sort());
    expect(Object.keys(en.permit.exemption)).toEqual([...PERMIT_EXEMPTIONS]);
    expect(Object.keys(en.problems).sort()).toEqual([...Object.keys(PROBLEMS), 'offline'].sort());
  });

  it('says why a voltage entered the table, and names each row', () => {
    expect(Object.keys(en.common.boundaries.because)).toEqual([...hazard.BOUNDARY_VOLTS_REASONS]);
    for (const current of ['ac', 'dc'] as const) {
      for (const volts of [12, 50, 120, 208, 277, 480, 900, 2000]) {
        const found = hazard.lookupShockBoundaries({ current, volts });
        if (found.inTable) expect(Object.keys(en.common.boundaries.rows)).toContain(found.row);
      }
    }
  });

  it('has a sentence for each limit of the arc flash methods', () => {
    const limits = Object.keys(en.findings['arc.study-needed'])
      .filter((key) => key.includes(':'))
      .map((key) => key.split(':')[1]);
    expect(limits.sort()).toEqual([...hazard.ARC_STUDY_LIMITS].sort());
  });

  /** Dotted paths of a schema: groups, and the fields that are answered. */
  function pathsOf(schema: z.ZodType, prefix: string): { groups: string[]; leaves: string[] } {
    interface Node {
      type?: string;
      properties?: Record<string, Node>;
      items?: Node;
    }
    const found = { groups: [] as string[], leaves: [] as string[] };
    const walk = (node: Node, path: string): void => {
      const inner = node.type === 'array' ? (node.items ?? {}) : node;
      if (!inner.properties) {
        found.leaves.push(path);
        return;
      }
      found.groups.push(path);
      for (const [key, child] of Object.entries(inner.properties)) {
        walk(child, path === '' ? key : `${path}.${key}`);
      }
    };
    walk(z.toJSONSchema(schema, { io: 'input', unrepresentable: 'any' }) as Node, prefix);
    return found;
  }

  it('labels every field of content, proof and close-out, and no other', () => {
    const all = [
      pathsOf(worksheetContentSchema, ''),
      pathsOf(proofSchema, 'proof'),
      pathsOf(closeOutSchema, 'closeOut'),
    ];
    const leaves = all.flatMap((paths) => paths.leaves);
    const known = [...leaves, ...all.flatMap((paths) => paths.groups)];
    const labels = Object.keys(en.fields);
    expect(leaves.filter((path) => !labels.includes(path))).toEqual([]);
    expect(labels.filter((path) => !known.includes(path))).toEqual([]);
    expect(Object.keys(en.hints).filter((path) => !labels.includes(path))).toEqual([]);
  });
});

describe('field errors', () => {
  it('has words for each code that the schemas give', () => {
    const bad: [z.ZodType, unknown][] = [
      [worksheetContentSchema, { nothing: 1 }],
      [worksheetContentSchema, { job: { area: 1 } }],
      [worksheetContentSchema, { job: { pointsOfWork: 41 } }],
      [worksheetContentSchema, { job: { pointsOfWork: 0 } }],
      [worksheetContentSchema, { job: { startsAt: 'soon' } }],
      [worksheetContentSchema, { job: { task: 'rest' } }],
      [worksheetContentSchema, { job: { area: '\u0000' } }],
      [record.reasonSchema, { reason: ' ' }],
      [record.strokesSchema, [[[1, 1]]]],
      [register.siteInputSchema, { name: 'A', timeZone: 'Nowhere' }],
      [user.newPin, '123456'],
    ];
    const known = [...Object.keys(en.common.fieldErrors), 'unrecognized_keys'];
    for (const [schema, value] of bad) {
      const issues = schema.safeParse(value).error?.issues ?? [];
      expect(issues).not.toEqual([]);
      for (const issue of issues) {
        expect(known).toContain(issue.code === 'custom' ? issue.params?.['code'] : issue.code);
      }
    }
  });
});

describe('both languages', () => {
  it('have the same keys', () => {
    const paths = (texts: [string, string][]) => [...new Set(texts.map(([path]) => path))];
    expect(paths(spanish)).toEqual(paths(english));
  });

  /** Names, units, codes and words that are the same in both languages. */
  const SAME = new Set(
    'Wideberth English Español CAT II III IV No NO Total Normal Error Supervisor supervisor Personal Control PDF CSV PIN ID AED SHA Volts volts Local rev cal cm kA'.split(
      ' ',
    ),
  );

  it('say different things but for a list of names', () => {
    const words = new Set(spanish.map(([path, text]) => `${path}: ${text}`));
    const same = english.filter(([path, text]) => {
      if (!words.has(`${path}: ${text}`)) return false;
      const spoken = text.replace(/\{[^}]*\}/g, '').match(/\p{L}{2,}/gu) ?? [];
      return spoken.some((word) => !SAME.has(word));
    });
    expect(same).toEqual([]);
  });

  it('keep Spanish within a quarter more', () => {
    const size = (texts: [string, string][]) =>
      texts.reduce((sum, [, text]) => sum + text.length, 0);
    expect(size(spanish) / size(english)).toBeLessThan(1.25);
  });

  it('keep to the voice', () => {
    // Said word for word by the caution text, and only there may the word stand.
    const ofTheCaution =
      /No current shown here is safe\.|Ninguna corriente (mostrada|que se muestra) aquí es segura\./;
    const banned =
      /\bsafe(ly)?\b|\bapproved\b|\bplease\b|\bsorry\b|!|¡|\bpor favor\b|\bsegur[oa]s?\b|\baprobad[oa]s?\b/i;
    const offending = [...english, ...spanish].filter(([, text]) =>
      banned.test(text.replace(ofTheCaution, '')),
    );
    expect(offending).toEqual([]);
  });

  it('hold no straight hole and no double space', () => {
    for (const [path, text] of [...english, ...spanish]) {
      expect(text, path).not.toMatch(/undefined|NaN|\[object|[^\S\n]{2}/);
    }
  });
});

describe('findingWords', () => {
  const finding = (
    code: string,
    severity: Severity,
    path = '/job',
    params: Record<string, string | number> = {},
  ) => ({ code, severity, path, params });

  it.each(LOCALES)('has no hole in any sentence without params (%s)', (locale) => {
    for (const [code, entry] of Object.entries(en.findings)) {
      for (const key of Object.keys(entry).filter((name) => name !== 'title')) {
        const [severity = '', limit] = key.split(/[:/]/);
        const params: Record<string, string> = limit === undefined ? {} : { limit };
        const { title, text } = findingWords(
          locale,
          finding(code, severity as Severity, '/crew/1/qualified', params),
        );
        expect(title, code).not.toBe('');
        expect(text, `${code} ${key}`).toMatch(/^[\p{Lu}¿“\d].*[.]$/u);
        expect(text, `${code} ${key}`).not.toMatch(/[{}[\]]|undefined|\s{2}| ,| \./);
      }
    }
  });

  it('names the way by number, kind and place', () => {
    const params = { index: 2, kind: 'battery unit', from: 'luminaire C6' };
    expect(
      findingWords('en-US', finding('sources.battery-connected', 'stop', '/sources/2', params))
        .text,
    ).toMatch(/^Way 3 \(battery unit, luminaire C6\) is still connected\./);
    expect(
      findingWords('es-MX', finding('sources.battery-connected', 'stop', '/sources/2', params))
        .text,
    ).toMatch(
      /^Fuente 3 \(unidad de batería, luminaria C6|^Fuente 3 \(unidad de batería, luminaire C6\) sigue conectada\./,
    );
    expect(findingWords('en-US', finding('sources.not-opened', 'stop', '/sources/0')).text).toMatch(
      /^Way 1 is not opened\./,
    );
    expect(findingWords('en-US', finding('sources.not-opened', 'stop', '/sources')).text).toMatch(
      /^A way it can be live is not opened\./,
    );
  });

  it('names people, points, pairs, items and topics', () => {
    const text = (
      code: string,
      severity: Severity,
      path: string,
      params: Record<string, string | number>,
    ) =>
      findingWords('en-US', finding(code, severity, path, params)).text.replaceAll('\u00a0', ' ');
    expect(
      text('shock.gloves-overdue', 'stop', '/crew/0', { name: 'Ines', dueOn: '2026-07-02' }),
    ).toBe(
      'The gloves of Ines are out of test since 2 Jul 2026. Leave them and take a pair that is in test.',
    );
    expect(text('shock.gloves-missing', 'stop', '/crew/1/gloves', {})).toMatch(
      /^Person 2 of the crew enters/,
    );
    expect(text('shock.gloves-missing', 'stop', '/protectiveEquipment', {})).toMatch(
      /^Somebody enters/,
    );
    expect(
      text('absence.voltage-present', 'stop', '/proof/readings', {
        point: 'A1',
        from: 'B',
        to: 'N',
        volts: 118.5,
      }),
    ).toMatch(/^A1: 118\.5 V is present, B to N\./);
    expect(
      text('absence.pairs-missing', 'open', '/proof/readings', { point: '', number: 2 }),
    ).toMatch(/^Point of work 2: readings are missing\./);
    expect(text('absence.pairs-missing', 'open', '/proof/readings', { point: '' })).toMatch(
      /^A point of work: /,
    );
    expect(
      text('equipment.not-at-hand', 'open', '/protectiveEquipment/ready', {
        item: 'rubber-insulating-gloves',
        class: '00',
      }),
    ).toMatch(/^Rubber insulating gloves, class 00 or better: not marked/);
    expect(text('equipment.not-at-hand', 'open', '/protectiveEquipment/ready', {})).toMatch(
      /^A piece of equipment: /,
    );
    expect(text('crew.briefing-open', 'open', '/briefing/topics', { topic: 'permit' })).toMatch(
      /^Not yet covered in the briefing: permit\./,
    );
    expect(text('crew.briefing-open', 'open', '/briefing/topics', { topic: 'weather' })).toMatch(
      /weather/,
    );
    expect(text('crew.briefing-open', 'open', '/briefing/topics', {})).toMatch(/: a topic\./);
  });

  it('puts an unanswered field under its label, with its row and section', () => {
    expect(findingWords('en-US', finding('supply.unanswered', 'open', '/supply/panel')).text).toBe(
      '“Panel” is not answered. Answer it in section 2.',
    );
    expect(
      findingWords('en-US', finding('sources.unanswered', 'open', '/sources/1/from')).text,
    ).toBe('Way 2: “Where it comes from” is not answered. Answer it in section 3.');
    expect(findingWords('es-MX', finding('crew.unanswered', 'open', '/crew/0/name')).text).toBe(
      'Persona 1 de la cuadrilla: falta contestar “Nombre”. Conteste en la sección 10.',
    );
    expect(findingWords('en-US', finding('job.unanswered', 'open', '/job/nothing')).text).toMatch(
      /^“A field” is not answered/,
    );
  });

  it('shows typed distances in both units where the person reads metres', () => {
    const params = { limit: 'working-distance-short', value: 15, allowed: 18 };
    const short = finding('arc.study-needed', 'stop', '/arcFlash/workingDistanceInches', params);
    expect(findingWords('en-US', short).text.replaceAll('\u00a0', ' ')).toContain(
      '1 ft 3 in, is shorter',
    );
    expect(findingWords('en-US', short, 'metric').text.replaceAll('\u00a0', ' ')).toContain(
      '0.381 m (1 ft 3 in), is shorter',
    );
  });

  it('writes each figure with its unit', () => {
    const text = (code: string, path: string, params: Record<string, string | number>) =>
      findingWords('en-US', finding(code, 'stop', path, params)).text.replaceAll('\u00a0', ' ');
    expect(text('sources.neutral-not-checked', '/proof/neutralAmperes', { amperes: 2.5 })).toMatch(
      /^2\.5 A flows/,
    );
    const fault = { limit: 'fault-current-exceeded', value: 50, allowed: 25 };
    expect(text('arc.study-needed', '/arcFlash', fault)).toContain('50 kA, is more than');
    const clearing = { limit: 'clearing-time-exceeded', value: 0.5, allowed: 0.03 };
    expect(text('arc.study-needed', '/arcFlash', clearing)).toContain('0.5 s, is longer');
    expect(text('window.too-long', '/job/endsAt', { minutes: 750 })).toContain('(12 h 30 min)');
    const ladder = { standingLevelFeet: 5, limit: 4 };
    expect(text('surroundings.ladder-top', '/surroundings/ladder', ladder)).toContain(
      'on, 5 ft 0 in, is too high on this ladder; highest 4 ft 0 in.',
    );
    const barricade = { inches: 20, requiredInches: 42 };
    expect(text('surroundings.barricade', '/surroundings/barricadeInches', barricade)).toContain(
      'at 1 ft 8 in, is nearer than it must be: 3 ft 6 in.',
    );
  });

  it('writes a figure without a unit, or of a unit that is not known, as a plain number', () => {
    expect(figure('en-US', 2.5, undefined, 'feet')).toBe('2.5');
    expect(figure('en-US', 2.5, 'furlongs', 'feet')).toBe('2.5');
    expect(figure('en-US', 208, 'V', 'metric')).toBe('208\u00a0V');
  });

  it('names the person of the gloves by number where no name is given', () => {
    const gloves = finding('shock.gloves-missing', 'stop', '/protectiveEquipment/gloves', {
      index: 1,
    });
    expect(findingWords('en-US', gloves).text).toMatch(/^Person 2 of the crew enters/);
  });

  it('lists several values and keeps words that it does not know', () => {
    const fits = { system: '208Y/120', fits: '480Y/277, 480 delta' };
    expect(
      findingWords('en-US', finding('supply.readings-do-not-fit', 'stop', '/supply/readings', fits))
        .text,
    ).toMatch(/480Y\/277.*and 480/);
    expect(
      findingWords(
        'en-US',
        finding('job.outside-scope', 'stop', '/job/special', { special: 'submarine' }),
      ).text,
    ).toMatch(/^Submarine: this sheet/);
  });

  it('says so where it has no words, rather than nothing', () => {
    const { sentence } = messages('en-US').common.fallback;
    expect(findingWords('en-US', finding('new.rule', 'open'))).toEqual({
      title: 'new.rule',
      text: sentence,
    });
    expect(findingWords('en-US', finding('sources.none', 'caution')).text).toBe(sentence);
    expect(findingWords('en-US', finding('window.over', 'open', '/job/endsAt')).text).toBe(
      '“Work ends” is not answered. Answer it in section 1.',
    );
  });

  it.each(LOCALES)('has a sentence for each rule at its own severity (%s)', (locale) => {
    const { sentence } = messages(locale).common.fallback;
    for (const { code, severity } of hazardRules) {
      expect(findingWords(locale, finding(code, severity)).text, code).not.toBe(sentence);
    }
  });

  it('has words for all that a worksheet without answers, and a bad one, is told', () => {
    const energized = { decision: { mode: 'energized' as const } };
    const bad = {
      ...energized,
      job: { task: 'replace luminaire' as const },
      supply: { damage: true, tripped: 'cause not found' as const },
      crew: [{ name: 'Ines', lead: true, qualified: false, closest: 'restricted' as const }],
    };
    const { sentence } = messages('en-US').common.fallback;
    for (const content of [{}, energized, bad]) {
      for (const stage of ['plan', 'work', 'close-out'] as const) {
        const { findings } = hazard.assess(content, { on: '2026-12-01T09:00:00-06:00', stage });
        for (const found of findings) {
          const { text } = findingWords('en-US', found);
          expect(text, found.code).toMatch(/^[\p{Lu}“\d].*\.$/u);
          expect(text, found.code).not.toBe(sentence);
          expect(text, found.code).not.toContain('A field');
        }
      }
    }
  });
});

describe('the other words', () => {
  it('names items with what is asked of them', () => {
    const plain = (text: string) => text.replaceAll('\u00a0', ' ');
    const tester = {
      id: 'contact-tester',
      params: { category: 'III', volts: 208, current: 'ac and dc' },
    };
    expect(plain(itemWords('en-US', tester))).toBe(
      'Contact tester with leads, CAT III, 208 V or more, AC and DC',
    );
    expect(plain(itemWords('es-MX', tester))).toBe(
      'Probador de contacto con cables, CAT III, 208 V o más, CA y CD',
    );
    expect(
      plain(itemWords('en-US', { id: 'arc-flash-suit-hood', params: { rating: 25 } })),
    ).toContain('25 cal/cm² or more');
    expect(itemWords('en-US', { id: 'new-item', params: {} })).toBe('New-item');
    expect(itemWords('en-US', { id: '{new}', params: {} })).toBe('Not known');
  });

  it('keeps an unknown value of a list', () => {
    expect(enumWord('es-MX', 'held', 'tag')).toBe('Solo etiqueta');
    expect(enumWord('es-MX', 'held', 'rope')).toBe('rope');
  });

  it('finds labels and sections by JSON Pointer', () => {
    expect(fieldLabel('en-US', '/sources/0/openedAt')).toBe('Opened at');
    expect(fieldLabel('en-US', '/nothing')).toBeNull();
    expect(sectionNumberOf('/surroundings/ladder/material')).toBe(9);
    expect(sectionNumberOf('')).toBe(1);
  });

  it('says where a figure comes from and how it was checked', () => {
    const words = (id: hazard.CitationId, locale: user.Locale = 'en-US') =>
      citationWords(locale, hazard.citation(id)).replaceAll('\u00a0', ' ');
    expect(words('osha1910.333(a)(1)')).toBe('OSHA 29 CFR 1910.333(a)(1). Read in the regulation');
    expect(words('nfpa70e.likelihood')).toBe(
      'NFPA 70E-2024 Table 130.5(C). From memory, to be checked',
    );
    expect(words('nec700.12')).toBe('NFPA 70 (NEC), 2023, 700.12. Two sources agree');
    expect(words('practice.neutral')).toBe('Shared neutrals. Common practice');
    expect(words('own.alone')).toBe(
      'Rule of this tool: Working alone. Our own rule, stricter than the table',
    );
    expect(citationPlace('en-US', hazard.citation('face86-35'))).toBe('NIOSH FACE 86-35');
    expect(words('face86-35')).toBe('NIOSH FACE 86-35. One source');
    expect(words('own.alone', 'es-MX')).toBe(
      'Regla de esta herramienta: Trabajar solo. Regla propia, más estricta que la tabla',
    );
  });

  it('leaves no English word in a Spanish citation', () => {
    const ids = [...COMMON_CITATION_IDS];
    const english = /\b(the|of|and|above|Who|Table|Note|Article|Exception|units|lighting|always)\b/;
    for (const id of ids) {
      expect(citationWords('es-MX', hazard.citation(id)), id).not.toMatch(english);
    }
    for (const edition of Object.values(hazard.EDITIONS)) {
      for (const cited of Object.values(edition.citations)) {
        expect(citationWords('es-MX', cited)).not.toMatch(english);
      }
    }
  });

  it('carries the caution in twelve numbered items', () => {
    const filled = { editions: 'NFPA 70E-2024', contact: '911', place: 'the lobby' };
    for (const locale of LOCALES) {
      const { caution } = messages(locale);
      expect(caution.full(filled)).toHaveLength(12);
      const text = caution
        .full(filled)
        .map((item) => `${item.lead} ${item.text}`)
        .join('\n');
      for (const word of Object.values(filled)) expect(text).toContain(word);
      for (const number of FIRST_USE_ITEMS) expect(caution.full(filled)[number - 1]).toBeDefined();
    }
  });

  it('never parts a number from its unit', () => {
    const ordinary = /\d (?:ft|in|s|V|A|kA|mA|m|W|cal\/cm²)(?![\p{L}\d])/u;
    for (const locale of LOCALES) {
      for (const [path, text] of textsOf(messages(locale))) {
        // Sentences of findings and items are joined once they are filled.
        if (!/^(findings|items)/.test(path)) expect(text, path).not.toMatch(ordinary);
      }
    }
  });
});
