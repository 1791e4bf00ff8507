import { InsightsScreen } from '@/components/insights/InsightsScreen';
import { OnlyFor } from '@/components/shell/SignedIn';

export default function InsightsRoute() {
  return (
    <OnlyFor roles={['supervisor', 'safety']}>
      <InsightsScreen />
    </OnlyFor>
  );
}
