import { describe, expect, it } from 'vitest';
import { closeOutFacts, contentFacts } from '@/shared/contentFacts';
import { worksheetContentSchema, type WorksheetContent } from '@/shared/worksheet';
import { FACT_OPTIONS as options, said, saidValues } from '../support/saidFacts';
import { soundWorksheet } from '../support/soundWorksheet';

describe('the answers of a worksheet in words', () => {
  it('are none where nothing is answered', () => {
    expect(contentFacts({}, options)).toEqual([]);
    expect(contentFacts({ job: {}, crew: [{}], sources: [{ id: 's1' }] }, options)).toEqual([]);
  });

  it('name the field, where it is kept and in which section it is shown', () => {
    expect(contentFacts({ job: { area: 'Level 1 hall' }, notes: 'Ask first.' }, options)).toEqual([
      { section: 'job', facts: [{ path: '/job/area', label: 'Area', value: 'Level 1 hall' }] },
      { section: 'job', facts: [{ path: '/notes', label: 'Notes', value: 'Ask first.' }] },
    ]);
  });

  it('come in the order of the worksheet, whatever the order they are kept in', () => {
    const content = {
      notes: 'x',
      crew: [{ name: 'Maya Ortiz' }],
      job: { task: 'inspect' },
    } as const;
    expect(contentFacts(content, options).map(({ section }) => section)).toEqual([
      'job',
      'crew',
      'job',
    ]);
    expect(said({ job: { area: 'B', siteId: 'A' } })).toEqual([
      ['Site', 'A'],
      ['Area', 'B'],
    ]);
  });

  it('leave out no answer of a whole worksheet but the ids that nobody reads', () => {
    const { content } = soundWorksheet();
    const told = contentFacts(content, options).flatMap(({ facts }) => facts);
    const paths = new Set(told.map(({ path }) => path));
    const untold: string[] = [];
    const walk = (value: unknown, path: string) => {
      if (paths.has(path)) return;
      if (typeof value !== 'object' || value === null) untold.push(path);
      else for (const [key, inner] of Object.entries(value)) walk(inner, `${path}/${key}`);
    };
    walk(worksheetContentSchema.parse(content), '');
    expect(untold).toEqual([
      '/sources/0/id',
      '/sources/1/id',
      '/sources/2/id',
      '/crew/0/id',
      '/crew/0/userId',
      '/crew/1/id',
      '/crew/1/userId',
    ]);
    expect(told.filter(({ label }) => label.includes('.'))).toEqual([]);
  });

  it('say yes, no and none in the language of the reader', () => {
    const content: WorksheetContent = { job: { occupied: true, crossesShift: false, special: [] } };
    expect(saidValues(content)).toEqual(['Yes', 'None', 'No']);
    expect(said(content, { locale: 'es-MX' })[0]).toEqual(['¿Hay gente en el edificio?', 'Sí']);
    expect(saidValues(content, { locale: 'es-MX' })).toEqual(['Sí', 'Ninguno', 'No']);
  });

  it('say what was picked from a list in words, several with a comma', () => {
    const content: WorksheetContent = {
      job: { task: 'replace lamp' },
      supply: { system: '480Y/277', conductorColors: ['brown', 'gray'] },
      egressSupply: ['generator', 'battery units'],
    };
    expect(said(content)).toEqual([
      ['Task', 'Replace a lamp'],
      ['System', '480Y/277_V, three-phase wye'],
      ['Conductor colors seen', 'Brown, Gray'],
      ['Where does the emergency egress supply come from?', 'Generator, Battery units'],
    ]);
    expect(saidValues({ job: { task: 'replace lamp' } }, { locale: 'es-MX' })).toEqual([
      'Cambiar una lámpara',
    ]);
  });

  it('name the equipment at hand and the topics of the briefing', () => {
    const content: WorksheetContent = {
      protectiveEquipment: { rubberGoodsId: 'an id', ready: ['lock-and-tag', 'own lamp'] },
      briefing: { topics: ['emergency plan', 'permit'] },
    };
    expect(said(content)).toEqual([
      ['Equipment at hand', 'Lock and tag, one of each for everyone who works, own lamp'],
      ['Topics covered', 'Emergency plan, Permit'],
    ]);
  });

  it.each(['constructor', '__proto__', 'own {lamp}', 'hook [long]'])(
    'say equipment that has no name here as it is written: %j',
    (item) => {
      expect(saidValues({ protectiveEquipment: { ready: [item] } })).toEqual([item]);
    },
  );

  it('name the site, or its id where the name is not known', () => {
    const content: WorksheetContent = { job: { siteId: '0190b5a4' } };
    expect(saidValues(content, { siteName: 'Brindle Court' })).toEqual(['Brindle Court']);
    expect(saidValues(content)).toEqual(['0190b5a4']);
  });
});

describe('figures', () => {
  it('carry their unit', () => {
    const content: WorksheetContent = {
      job: { pointsOfWork: 2 },
      supply: { circuitVolts: 277, watts: 1200, readings: { phaseToPhase: [480, 479.5] } },
      absenceTest: { ratedVolts: 1000 },
      arcFlash: {
        label: { incidentEnergyCalPerCm2: 1.2, minimumArcRatingCalPerCm2: 8, ppeCategory: 2 },
        availableFaultKiloamperes: 8.25,
        clearingSeconds: 0.03,
        transformer: { kilovoltAmperes: 75, impedancePercent: 2.5, phases: 3 },
      },
    };
    expect(saidValues(content)).toEqual([
      '2',
      '277_V',
      '1200_W',
      '480.0_V, 479.5_V',
      '1000_V',
      '1.2_cal/cm²',
      '8_cal/cm²',
      '2',
      '8.25_kA',
      '0.03_s',
      '75_kVA',
      '2.5_%',
      '3',
    ]);
  });

  it('of length are in the units of the reader and never longer than they are', () => {
    const content: WorksheetContent = {
      arcFlash: {
        workingDistanceInches: 18,
        label: { workingDistanceInches: 24, arcFlashBoundaryInches: 42 },
      },
      surroundings: {
        ladder: { sizeFeet: 6, standingLevelFeet: 3.5 },
        ceilingHeightFeet: 9,
        barricadeInches: 120,
      },
    };
    expect(saidValues(content)).toEqual([
      '1_ft_6_in',
      '2_ft_0_in',
      '3_ft_6_in',
      '6_ft_0_in',
      '3_ft_6_in',
      '9_ft_0_in',
      '10_ft_0_in',
    ]);
    expect(saidValues(content, { units: 'metric' })).toEqual([
      '0.457_m',
      '0.609_m',
      '1.066_m',
      '1.828_m',
      '1.066_m',
      '2.743_m',
      '3.048_m',
    ]);
  });
});

describe('dates and times', () => {
  const content: WorksheetContent = {
    job: { startsAt: '2026-12-01T14:00:00Z' },
    decision: { permit: { validUntil: '2026-12-01T12:00:00-06:00' } },
    arcFlash: { label: { reviewedOn: '2024-05-31' } },
    crew: [{ qualifiedThrough: '2028-01-01' }],
  };

  it('are of the clock of the site', () => {
    expect(saidValues(content)).toEqual([
      '1_Dec_2026, 08:00_CST',
      '1_Dec_2026, 12:00_CST',
      '31_May_2024',
      '1_Jan_2028',
    ]);
    expect(saidValues(content, { timeZone: 'America/Denver', locale: 'es-MX' })).toEqual([
      '1_dic_2026, 07:00_MST',
      '1_dic_2026, 11:00_MST',
      '31_may_2024',
      '1_ene_2028',
    ]);
  });

  it.each(['Floor 2', 'Lobby, beside lift 3', 'Panel LP-12', '2026'])(
    'are never read into the place of an AED: %j',
    (aedAt) => {
      expect(said({ briefing: { emergency: { aedAt } } })).toEqual([['AED place', aedAt]]);
    },
  );

  it('stay as they stand where they are none', () => {
    const unreadable = {
      job: { startsAt: 'after lunch', endsAt: '2026-13-01T08:00:00Z' },
      crew: [{ qualifiedThrough: 'next May' }],
    };
    expect(saidValues(unreadable)).toEqual(['after lunch', '2026-13-01T08:00:00Z', 'next May']);
  });
});

describe('an answer of another version', () => {
  it('is told as it stands rather than left out', () => {
    const content = {
      job: { task: 'paint' },
      surroundings: { ladder: 'borrowed', groundedSurfaces: 'many', lift: null },
      briefing: { topics: ['tea'] },
    };
    expect(contentFacts(content, options).flatMap(({ facts }) => facts)).toEqual([
      { path: '/job/task', label: 'Task', value: 'paint' },
      { path: '/surroundings/groundedSurfaces', label: 'Grounded surfaces', value: 'many' },
      { path: '/surroundings/ladder', label: 'surroundings.ladder', value: 'borrowed' },
      { path: '/surroundings/lift', label: 'surroundings.lift', value: 'null' },
      { path: '/briefing/topics', label: 'Topics covered', value: 'tea' },
    ]);
  });
});

describe('a close-out in words', () => {
  it('names each answer, in the order of the form', () => {
    const closeOut = { notes: 'Lock 12 stays.', egressTestedSeconds: 90, toolsClear: true };
    expect(closeOutFacts(closeOut, options)).toEqual([
      {
        path: '/closeOut/toolsClear',
        label: 'Are tools, jumpers and test leads out?',
        value: 'Yes',
      },
      {
        path: '/closeOut/egressTestedSeconds',
        label: 'Emergency lights tested on battery for',
        value: '90\u00a0s',
      },
      { path: '/closeOut/notes', label: 'Close-out notes', value: 'Lock 12 stays.' },
    ]);
    expect(closeOutFacts({}, options)).toEqual([]);
  });
});
