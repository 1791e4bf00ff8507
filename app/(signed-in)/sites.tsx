import { SitesScreen } from '@/components/register/SitesScreen';
import { OnlyFor } from '@/components/shell/SignedIn';

export default function SitesRoute() {
  return (
    <OnlyFor roles={['safety']}>
      <SitesScreen />
    </OnlyFor>
  );
}
