import { useLocalSearchParams } from 'expo-router';
import { z } from 'zod';
import { HelperScreen } from '@/components/helper/HelperScreen';
import { NotFoundScreen } from '@/components/ui';

const paramsSchema = z.object({ worksheetId: z.uuid(), signerId: z.uuid() });

export default function BriefRoute() {
  const params = paramsSchema.safeParse(useLocalSearchParams());
  if (!params.success) return <NotFoundScreen />;
  return <HelperScreen {...params.data} />;
}
