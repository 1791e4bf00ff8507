import { NotFoundScreen } from '@/components/ui';

export default function NotFoundRoute() {
  return <NotFoundScreen />;
}
