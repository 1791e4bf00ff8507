import { useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import type { Assessment } from '@/hazard';
import type { Proof } from '@/shared/worksheet';
import { json, request } from '../api/request';
import { worksheetKeys } from '../worksheet/worksheetQueries';

const recordedSchema = z.object({
  id: z.string(),
  at: z.string(),
  assessment: z.custom<Assessment>((value) => typeof value === 'object' && value !== null),
});

/** Records one proof; its id was made when the test began, so that a repeated post adds nothing. */
export function useRecordProof(worksheetId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { id: string; proof: Proof; pin: string }) =>
      request(recordedSchema, `/worksheets/${worksheetId}/proofs`, json('POST', body)),
    onSuccess: () => client.invalidateQueries({ queryKey: worksheetKeys.all }),
  });
}
