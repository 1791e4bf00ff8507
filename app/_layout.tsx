import { Slot, type ErrorBoundaryProps } from 'expo-router';
import { AppRoot } from '@/components/shell/AppRoot';
import { usePageChange } from '@/components/shell/usePageChange';
import { ProblemScreen } from '@/components/ui';

export function ErrorBoundary({ error, retry }: ErrorBoundaryProps) {
  return <ProblemScreen error={error} onRetry={() => void retry()} />;
}

export default function RootLayout() {
  usePageChange();
  return (
    <AppRoot>
      <Slot />
    </AppRoot>
  );
}
