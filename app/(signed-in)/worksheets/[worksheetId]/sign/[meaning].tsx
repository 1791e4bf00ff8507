import { useLocalSearchParams } from 'expo-router';
import { z } from 'zod';
import { SignScreen } from '@/components/signing/SignScreen';
import { NotFoundScreen } from '@/components/ui';

const paramsSchema = z.object({
  worksheetId: z.uuid(),
  meaning: z.enum(['prepared', 'countersigned']),
});

export default function SignRoute() {
  const params = paramsSchema.safeParse(useLocalSearchParams());
  if (!params.success) return <NotFoundScreen />;
  return <SignScreen {...params.data} />;
}
