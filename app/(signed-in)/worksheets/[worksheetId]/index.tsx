import { useLocalSearchParams } from 'expo-router';
import { z } from 'zod';
import { WorksheetScreen } from '@/components/worksheet/WorksheetScreen';
import { NotFoundScreen } from '@/components/ui';

const paramsSchema = z.object({ worksheetId: z.uuid() });

export default function WorksheetRoute() {
  const params = paramsSchema.safeParse(useLocalSearchParams());
  if (!params.success) return <NotFoundScreen />;
  return <WorksheetScreen worksheetId={params.data.worksheetId} />;
}
