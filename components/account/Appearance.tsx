import { useAtom } from 'jotai';
import { LOCALES, THEMES, UNITS } from '@/shared/user';
import { deviceThemeAtom } from '../api/deviceChoices';
import { usePatchSession, useUser } from '../api/session';
import { useMessages } from '../i18n/useMessages';
import { Choice, describeFault, Notice, Section, Toggle } from '../ui';

/** Language, units and light; each choice holds at once and on every device of this person. */
export function Appearance() {
  const user = useUser();
  const messages = useMessages();
  const { account } = messages;
  const patch = usePatchSession();
  const [deviceTheme, setDeviceTheme] = useAtom(deviceThemeAtom);
  return (
    <Section id="appearance" title={account.screen}>
      {patch.isError && !(patch.error instanceof TypeError) && (
        <Notice live>{describeFault(patch.error, messages)}</Notice>
      )}
      <Choice
        label={account.language}
        layout="row"
        value={user.locale}
        onChange={(locale) => patch.mutate({ locale })}
        options={LOCALES.map((value) => ({ value, label: account.languages[value] }))}
      />
      <Choice
        label={account.units}
        hint={account.unitsHint}
        layout="row"
        value={user.units}
        onChange={(units) => patch.mutate({ units })}
        options={UNITS.map((value) => ({ value, label: account.unitOptions[value] }))}
      />
      <Choice
        label={account.theme}
        hint={account.themeHint}
        value={user.theme}
        onChange={(theme) => patch.mutate({ theme })}
        options={THEMES.map((value) => ({ value, label: account.themes[value] }))}
      />
      <Toggle
        label={account.thisDeviceOnly}
        note={account.thisDeviceNote}
        checked={deviceTheme === 'sunlight'}
        onChange={(on) => setDeviceTheme(on ? 'sunlight' : null)}
      />
    </Section>
  );
}
