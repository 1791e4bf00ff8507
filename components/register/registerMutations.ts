import { useMutation, useQueryClient } from '@tanstack/react-query';
import type { z } from 'zod';
import { rubberGoodsSchema, siteSchema } from '@/shared/register';
import { importAnswerSchema } from '@/shared/registerCsv';
import { personSchema } from '@/shared/user';
import { json, request } from '../api/request';
import { peopleQuery, rubberGoodsQuery, sitesQuery } from '../worksheet/registerQueries';

const SUBJECTS = {
  people: { path: '/users', schema: personSchema },
  sites: { path: '/sites', schema: siteSchema },
  goods: { path: '/rubber-goods', schema: rubberGoodsSchema },
} as const;
export type Subject = keyof typeof SUBJECTS;
export type RecordOf<S extends Subject> = z.output<(typeof SUBJECTS)[S]['schema']>;

/** Whatever changes in the register is read again everywhere: people name sites, sites name people. */
function useReadAgain() {
  const client = useQueryClient();
  return () =>
    Promise.all(
      [peopleQuery, sitesQuery, rubberGoodsQuery].map(({ queryKey }) =>
        client.invalidateQueries({ queryKey }),
      ),
    );
}

interface Target {
  /** Undefined where a record is added. */
  id: string | undefined;
  /** What is added to the record, where it is not the record itself that changes. */
  part?: 'tests' | 'invitation';
}

/** Adds a record, changes the one with that id, or adds a part to it. */
export function useSaveRecord<S extends Subject>(subject: S, { id, part }: Target) {
  const readAgain = useReadAgain();
  const { path, schema } = SUBJECTS[subject];
  return useMutation({
    mutationFn: async (body: unknown) => {
      const saved =
        id === undefined
          ? await request(schema, path, json('POST', body))
          : part === undefined
            ? await request(schema, `${path}/${id}`, json('PATCH', body))
            : await request(schema, `${path}/${id}/${part}`, json('POST', body));
      return saved as RecordOf<S>;
    },
    onSuccess: () => readAgain(),
  });
}

/** What the lines of a file would do; with `confirm` it is done, all of it or nothing. */
export function useImport(subject: 'people' | 'goods') {
  const readAgain = useReadAgain();
  const { path } = SUBJECTS[subject];
  return useMutation({
    mutationFn: (body: { csv: string; confirm?: boolean }) =>
      request(importAnswerSchema, `${path}/import`, json('POST', body)),
    onSuccess: ({ created }) => (created > 0 ? readAgain() : undefined),
  });
}
