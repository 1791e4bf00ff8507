import { useLocalSearchParams } from 'expo-router';
import { z } from 'zod';
import { CloseOutScreen } from '@/components/closeout/CloseOutScreen';
import { NotFoundScreen } from '@/components/ui';

const paramsSchema = z.object({ worksheetId: z.uuid() });

export default function CloseRoute() {
  const params = paramsSchema.safeParse(useLocalSearchParams());
  if (!params.success) return <NotFoundScreen />;
  return <CloseOutScreen worksheetId={params.data.worksheetId} />;
}
