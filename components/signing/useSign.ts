import { useMutation, useQueryClient } from '@tanstack/react-query';
import { useState } from 'react';
import { v7 as newId } from 'uuid';
import { signatureSchema, type Meaning, type WorksheetRecord } from '@/shared/record';
import { isProblem } from '../api/ApiProblem';
import { json, request } from '../api/request';
import type { StrokeList } from '../ui';
import { worksheetKeys } from '../worksheet/worksheetQueries';

interface Signing {
  record: WorksheetRecord;
  meaning: Meaning;
  signerId: string;
}

/**
 * Sends one signature. Its id is made once, so that pressing again after a
 * lost answer gives the same signature and no second one.
 */
export function useSign({ record, meaning, signerId }: Signing) {
  const client = useQueryClient();
  const [id, setId] = useState(() => newId());
  return useMutation({
    mutationFn: (entered: { pin: string; strokes: StrokeList }) =>
      request(
        signatureSchema,
        `/worksheets/${record.id}/signatures`,
        json('POST', { id, meaning, signerId, contentHash: record.contentHash, ...entered }),
      ),
    onSuccess: () => client.invalidateQueries({ queryKey: worksheetKeys.all }),
    onError: (error) => {
      if (isProblem(error, 'id-taken')) setId(newId());
    },
  });
}
