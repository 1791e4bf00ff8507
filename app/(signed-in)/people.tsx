import { PeopleScreen } from '@/components/register/PeopleScreen';
import { OnlyFor } from '@/components/shell/SignedIn';

export default function PeopleRoute() {
  return (
    <OnlyFor roles={['safety']}>
      <PeopleScreen />
    </OnlyFor>
  );
}
