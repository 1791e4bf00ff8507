import { ArchiveScreen } from '@/components/archive/ArchiveScreen';

export default function ArchiveRoute() {
  return <ArchiveScreen />;
}
