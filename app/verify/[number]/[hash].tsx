import { useLocalSearchParams } from 'expo-router';
import { z } from 'zod';
import { readPaper } from '@/components/verify/papers';
import { VerifyFormScreen } from '@/components/verify/VerifyFormScreen';
import { VerifyScreen } from '@/components/verify/VerifyScreen';

const paramsSchema = z.object({ number: z.string().max(200), hash: z.string().max(400) });

/** A mistyped address is no verdict on the paper: it leads back to the form. */
export default function VerifyRoute() {
  const params = paramsSchema.safeParse(useLocalSearchParams());
  if (!params.success) return <VerifyFormScreen />;
  const { faults, ...paper } = readPaper(params.data);
  if (faults.length > 0) return <VerifyFormScreen initial={params.data} />;
  return <VerifyScreen paper={paper} />;
}
