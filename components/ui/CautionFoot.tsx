import { useMessages } from '../i18n/useMessages';
import { Text } from './Text';

/** What every screen says: the tool gives no permission, a qualified person decides. */
export function CautionFoot({ full = false }: { full?: boolean }) {
  const { caution } = useMessages();
  const inFull = () =>
    caution
      .full(caution.unfilled)
      .map(({ lead, text }, i) => `${i + 1}. ${lead} ${text}`)
      .join('\n');
  return (
    <Text variant="label" weight="400" color="ink2" role="note">
      {full ? inFull() : caution.short}
    </Text>
  );
}
