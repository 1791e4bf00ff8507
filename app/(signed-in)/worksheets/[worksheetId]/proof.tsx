import { useLocalSearchParams } from 'expo-router';
import { z } from 'zod';
import { ProofScreen } from '@/components/proof/ProofScreen';
import { NotFoundScreen } from '@/components/ui';

const paramsSchema = z.object({ worksheetId: z.uuid() });

export default function ProofRoute() {
  const params = paramsSchema.safeParse(useLocalSearchParams());
  if (!params.success) return <NotFoundScreen />;
  return <ProofScreen worksheetId={params.data.worksheetId} />;
}
