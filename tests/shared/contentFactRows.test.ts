import { describe, expect, it } from 'vitest';
import { contentFacts } from '@/shared/contentFacts';
import type { WorksheetContent } from '@/shared/worksheet';
import { FACT_OPTIONS as options, said, saidValues } from '../support/saidFacts';

const headingsOf = (content: WorksheetContent) =>
  contentFacts(content, options).map(({ heading }) => heading);

describe('rows of a worksheet in words', () => {
  it('of the ways it can be live stand under their number and kind', () => {
    const content: WorksheetContent = {
      sources: [
        { id: 's1', kind: 'normal', from: 'LA-1 ckt 7', openedAt: 'breaker' },
        { id: 's2', from: 'door 2', openedAt: 'none' },
      ],
    };
    expect(contentFacts(content, options)).toEqual([
      {
        section: 'sources',
        heading: '3.1 Normal branch circuit',
        facts: [
          { path: '/sources/0/kind', label: 'Kind of way', value: 'Normal branch circuit' },
          { path: '/sources/0/from', label: 'Where it comes from', value: 'LA-1 ckt 7' },
          { path: '/sources/0/openedAt', label: 'Opened at', value: 'Branch breaker' },
        ],
      },
      {
        section: 'sources',
        heading: '3.2',
        facts: [
          { path: '/sources/1/from', label: 'Where it comes from', value: 'door 2' },
          { path: '/sources/1/openedAt', label: 'Opened at', value: 'Not opened' },
        ],
      },
    ]);
  });

  it('of the crew stand under the name, or the number of the person', () => {
    const content: WorksheetContent = { crew: [{ name: 'Maya Ortiz' }, { lead: false }] };
    expect(headingsOf(content)).toEqual(['Maya Ortiz', '2']);
    expect(contentFacts(content, options).map(({ section }) => section)).toEqual(['crew', 'crew']);
  });

  it('of grounded surfaces stay among the surroundings', () => {
    const content: WorksheetContent = {
      surroundings: { groundedSurfaces: [{ kind: 'duct' }, { kind: 'pipe' }], wet: false },
    };
    expect(headingsOf(content)).toEqual([undefined]);
    expect(said(content)).toEqual([
      ['Grounded surface', 'Duct'],
      ['Grounded surface', 'Pipe'],
      ['Is anything wet?', 'No'],
    ]);
  });

  it('are said to be none where the list is empty', () => {
    const content = { sources: [], surroundings: { groundedSurfaces: [] }, crew: [] };
    expect(said(content)).toEqual([
      ['Ways it can be live', 'None'],
      ['Grounded surfaces', 'None'],
      ['Crew', 'None'],
    ]);
    expect(contentFacts(content, options)[0]?.facts[0]?.path).toBe('/sources');
  });

  it('are named where another answer points at them', () => {
    const content: WorksheetContent = {
      sources: [
        { id: 's1', kind: 'generator' },
        { sameConductorsAs: 's1', lockedBy: ['c2', 'c1'], byCrewId: 'c1' },
      ],
      absenceTest: { byCrewId: 'c2' },
      crew: [
        { id: 'c1', name: 'Maya Ortiz' },
        { id: 'c2', name: 'Olin Marsh' },
      ],
    };
    expect(said(content).slice(1, 5)).toEqual([
      ['Same conductors as', '3.1 Generator-backed emergency branch'],
      ['Whose locks hang on it', 'Olin Marsh, Maya Ortiz'],
      ['Who opens and locks it', 'Maya Ortiz'],
      ['Who tests', 'Olin Marsh'],
    ]);
  });

  it('are called by their id where they are gone or have no name', () => {
    const content: WorksheetContent = {
      sources: [{ sameConductorsAs: 's9', lockedBy: ['c1', 'c9'] }],
      crew: [{ id: 'c1' }],
    };
    expect(saidValues(content)).toEqual(['s9', 'c1, c9']);
    expect(saidValues({ absenceTest: { byCrewId: 'c1' } })).toEqual(['c1']);
  });
});
