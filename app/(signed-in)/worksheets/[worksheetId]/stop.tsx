import { useLocalSearchParams } from 'expo-router';
import { z } from 'zod';
import { StopScreen } from '@/components/stop/StopScreen';
import { NotFoundScreen } from '@/components/ui';

const paramsSchema = z.object({ worksheetId: z.uuid() });

export default function StopRoute() {
  const params = paramsSchema.safeParse(useLocalSearchParams());
  if (!params.success) return <NotFoundScreen />;
  return <StopScreen worksheetId={params.data.worksheetId} />;
}
