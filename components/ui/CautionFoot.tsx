import { useMessages } from '../i18n/useMessages';
import { Text } from './Text';

/** What every screen says: the tool gives no permission, a qualified person decides. */
export function CautionFoot() {
  const { caution } = useMessages();
  return (
    <Text variant="label" weight="400" color="ink2" role="note">
      {caution.short}
    </Text>
  );
}
