import { router, useLocalSearchParams, type Href } from 'expo-router';
import { z } from 'zod';
import { keepListPlace } from '../shell/listPlace';
import { useBreakpoint } from '../theme/useBreakpoint';

const ACTS = ['edit', 'retire', 'test', 'import'] as const;
export type RegisterAct = (typeof ACTS)[number];

const one = z.string().optional().catch(undefined);
const viewSchema = z.object({
  /** The open record, or `new`. */
  id: one,
  act: z.enum(ACTS).optional().catch(undefined),
  state: one,
  site: one,
  /** Class or role. */
  of: one,
  sort: one,
  /** What was just done, said once above the record. */
  done: one,
});
export type RegisterView = z.infer<typeof viewSchema>;

const without = (view: RegisterView): Record<string, string> =>
  Object.fromEntries(
    Object.entries(view).filter((entry): entry is [string, string] => entry[1] !== undefined),
  );

export interface RegisterViewControl extends RegisterView {
  /** Changes filters or the order: the address follows, the list keeps its place. */
  set: (change: Partial<RegisterView>) => void;
  /** Opens a record or an act beside the list, or over it where there is no room beside. */
  open: (change: Pick<RegisterView, 'id' | 'act' | 'done'>) => void;
  /** Back to the list with its filters. */
  close: () => void;
}

/** What of a register is shown: kept in the address, so that it can be sent and come back to. */
export function useRegisterView(pathname: '/people' | '/sites' | '/rubber-goods') {
  const view = viewSchema.parse(useLocalSearchParams());
  const { isWide } = useBreakpoint();
  const at = (next: RegisterView): Href => ({ pathname, params: without(next) });
  const control: RegisterViewControl = {
    ...view,
    set: (change) => router.replace(at({ ...view, ...change })),
    open: ({ id, act, done }) => {
      const next = at({ ...view, id, act, done });
      if (isWide || view.id !== undefined || view.act !== undefined) {
        router.replace(next);
        return;
      }
      keepListPlace(pathname);
      router.push(next);
    },
    close: () => router.replace(at({ ...view, id: undefined, act: undefined, done: undefined })),
  };
  return control;
}
