import { useLocalSearchParams } from 'expo-router';
import { z } from 'zod';
import { TrailScreen } from '@/components/trail/TrailScreen';
import { NotFoundScreen } from '@/components/ui';

const paramsSchema = z.object({ worksheetId: z.uuid() });

export default function TrailRoute() {
  const params = paramsSchema.safeParse(useLocalSearchParams());
  if (!params.success) return <NotFoundScreen />;
  return <TrailScreen worksheetId={params.data.worksheetId} />;
}
