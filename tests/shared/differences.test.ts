import { describe, expect, it } from 'vitest';
import { differences } from '@/shared/differences';

describe('differences between two contents', () => {
  it('names each field with what it was and what it is', () => {
    expect(
      differences(
        { job: { area: 'Hall', task: 'inspect' }, notes: 'x' },
        { job: { area: 'Lobby', task: 'inspect', occupied: false } },
      ),
    ).toEqual([
      { path: '/job/area', before: 'Hall', after: 'Lobby' },
      { path: '/job/occupied', after: false },
      { path: '/notes', before: 'x' },
    ]);
  });

  it('finds none between equal contents, whatever the order of their keys', () => {
    expect(differences({ a: 1, b: [1, 2] }, { b: [1, 2], a: 1 })).toEqual([]);
    expect(differences({}, {})).toEqual([]);
  });

  it('shows a list of plain answers whole', () => {
    expect(differences({ topics: ['a', 'b'] }, { topics: ['a'] })).toEqual([
      { path: '/topics', before: ['a', 'b'], after: ['a'] },
    ]);
    expect(differences({ topics: ['a'] }, { topics: ['b'] })).toEqual([
      { path: '/topics', before: ['a'], after: ['b'] },
    ]);
  });

  it('matches rows by their id, wherever they stand', () => {
    const before = {
      sources: [
        { id: 's1', held: 'lock' },
        { id: 's2', held: 'tag' },
      ],
    };
    const after = {
      sources: [
        { id: 's3', held: 'none' },
        { id: 's2', held: 'lock' },
      ],
    };
    expect(differences(before, after)).toEqual([
      { path: '/sources/0', before: { id: 's1', held: 'lock' } },
      { path: '/sources/0', after: { id: 's3', held: 'none' } },
      { path: '/sources/1/held', before: 'tag', after: 'lock' },
    ]);
  });

  it('matches rows without ids, or with an id twice, by their place', () => {
    expect(
      differences(
        { rows: [{ kind: 'duct' }, { kind: 'pipe' }] },
        { rows: [{ kind: 'duct' }, { kind: 'strut' }, { kind: 'pipe' }] },
      ),
    ).toEqual([
      { path: '/rows/1/kind', before: 'pipe', after: 'strut' },
      { path: '/rows/2', after: { kind: 'pipe' } },
    ]);
    const twice = [
      { id: 'c1', name: 'A' },
      { id: 'c1', name: 'B' },
    ];
    expect(differences({ crew: twice }, { crew: twice.slice(0, 1) })).toEqual([
      { path: '/crew/1', before: { id: 'c1', name: 'B' } },
    ]);
  });

  it('shows each row of a list that was empty, and a list that becomes something else whole', () => {
    const row = { id: 's1' };
    expect(differences({ sources: [] }, { sources: [row] })).toEqual([
      { path: '/sources/0', after: row },
    ]);
    expect(differences({ sources: [row] }, { sources: [] })).toEqual([
      { path: '/sources/0', before: row },
    ]);
    expect(differences({ sources: [row] }, {})).toEqual([{ path: '/sources', before: [row] }]);
    expect(differences({ sources: [] }, { sources: 'x' })).toEqual([
      { path: '/sources', before: [], after: 'x' },
    ]);
    expect(differences({ sources: [] }, { sources: [] })).toEqual([]);
  });

  it('escapes what has a meaning in a JSON Pointer', () => {
    expect(differences({ 'a/b~c': 1 }, { 'a/b~c': 2 })).toEqual([
      { path: '/a~1b~0c', before: 1, after: 2 },
    ]);
  });
});
