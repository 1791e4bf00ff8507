import { describe, expect, it } from 'vitest';
import { problemName, problemSchema } from '@/shared/problem';

describe('the kind of a problem', () => {
  it('is what stands after /problems/, wherever the server is', () => {
    expect(problemName('/problems/wrong-pin')).toBe('wrong-pin');
    expect(problemName('https://wideberth.example/problems/stale-version')).toBe('stale-version');
    expect(problemName('https://a.example/problems/of/problems/not-ready')).toBe('not-ready');
  });

  it.each([
    'about:blank',
    '',
    '/problems/',
    '/problems/of-a-later-version',
    '/problems/wrong-pin/more',
    // Words that every object of the language knows are no kinds of problem.
    '/problems/constructor',
    '/problems/toString',
    '/problems/__proto__',
  ])('is unexpected where this client does not know it: %j', (type) => {
    expect(problemName(type)).toBe('unexpected');
  });
});

describe('a problem document', () => {
  const least = { type: '/problems/not-found', title: 'Not found.', status: 404 };

  it('may leave out everything but type, title and status, and may carry more', () => {
    expect(problemSchema.parse({ ...least, retryAt: '14:00' })).toEqual({
      ...least,
      retryAt: '14:00',
    });
    for (const key of ['type', 'title', 'status'] as const) {
      const { [key]: _, ...rest } = least;
      expect(problemSchema.safeParse(rest).success).toBe(false);
    }
  });

  it('names each bad field by where it stands', () => {
    const error = { pointer: '#/pin', code: 'pin', message: 'six digits' };
    expect(problemSchema.parse({ ...least, errors: [error] }).errors).toEqual([error]);
    const nowhere = { code: 'pin', message: 'six digits' };
    expect(problemSchema.safeParse({ ...least, errors: [nowhere] }).success).toBe(false);
  });
});
