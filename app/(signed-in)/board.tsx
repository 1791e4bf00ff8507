import { BoardScreen } from '@/components/board/BoardScreen';
import { OnlyFor } from '@/components/shell/SignedIn';

export default function BoardRoute() {
  return (
    <OnlyFor roles={['supervisor', 'safety']}>
      <BoardScreen />
    </OnlyFor>
  );
}
