import type { ReactNode } from 'react';
import type { CrewMember } from '@/hazard';
import type { WorksheetRecord } from '@/shared/record';

export type HelperPage = 'read' | 'ask' | 'refuse' | 'sign' | 'signed';

/** What every page of the helper's is drawn from. */
export interface HelperPageProps {
  record: WorksheetRecord;
  member: CrewMember & { userId: string };
  page: HelperPage;
  onPage: (page: HelperPage) => void;
  headerEnd: ReactNode;
}
