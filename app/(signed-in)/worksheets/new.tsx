import { NewWorksheetScreen } from '@/components/worksheet/NewWorksheetScreen';

export default function NewWorksheetRoute() {
  return <NewWorksheetScreen />;
}
