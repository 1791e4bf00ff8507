import { messages, type Messages } from '@/shared/messages';
import { useLocale } from './preferences';

/** Every word of the interface, in the language of the person who reads. */
export function useMessages(): Messages {
  return messages(useLocale());
}
