import { StyleSheet, View } from 'react-native';
import { list } from '@/shared/format';
import type { Site } from '@/shared/register';
import type { Person } from '@/shared/user';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import {
  Button,
  describeFault,
  Facts,
  FirstAidPanel,
  Notice,
  Section,
  Text,
  type FirstAidRow,
} from '../ui';
import { useSaveRecord } from './registerMutations';
import { RetireForm } from './RetireForm';
import type { RegisterViewControl } from './useRegisterView';
import { zoneWord } from './zoneWord';

function Buttons({ site, view }: { site: Site; view: RegisterViewControl }) {
  const messages = useMessages();
  const { register } = messages;
  const save = useSaveRecord('sites', { id: site.id });
  if (site.retired) {
    return (
      <>
        {save.isError && <Text variant="strong">{describeFault(save.error, messages)}</Text>}
        <Button
          label={register.takeBack}
          busy={save.isPending}
          onPress={() => save.mutate({ retired: false })}
        />
      </>
    );
  }
  return (
    <View style={styles.buttons}>
      <Button
        kind="primary"
        icon="pen"
        label={register.edit}
        style={styles.grow}
        onPress={() => view.open({ id: site.id, act: 'edit' })}
      />
      <Button
        label={register.retire}
        style={styles.grow}
        onPress={() => view.open({ id: site.id, act: 'retire' })}
      />
    </View>
  );
}

function Panels({ site }: { site: Site }) {
  const { register, enumerations } = useMessages();
  const words = register.sites;
  return (
    <Section id="site-panels" title={words.panels}>
      {site.panels.length === 0 ? (
        <Text color="ink2">{words.noPanels}</Text>
      ) : (
        <Facts
          facts={site.panels.map(({ name, system, circuits = [] }) => ({
            label: name,
            value: circuits.length === 0 ? words.noCircuits : circuits.join(', '),
            note: system === undefined ? undefined : enumerations.system[system],
          }))}
        />
      )}
    </Section>
  );
}

function Plan({ site }: { site: Site }) {
  const { register } = useMessages();
  const words = register.sites;
  const { contact, rescue, firstAid, aedAt } = site.emergency;
  const rows: [FirstAidRow['icon'], string, string | undefined][] = [
    ['phone', words.contact, contact],
    ['person', words.rescue, rescue],
    ['plus', words.firstAid, firstAid],
    ['aed', words.aedAt, aedAt],
  ];
  const known = rows.flatMap(([icon, label, text]) =>
    text === undefined || text === '' ? [] : [{ icon, text: `${label}: ${text}` }],
  );
  return known.length === 0 ? (
    <Notice title={words.emergency}>{words.noPlan}</Notice>
  ) : (
    <FirstAidPanel title={words.emergency} rows={known} />
  );
}

function Members({ site, people }: { site: Site; people: readonly Person[] }) {
  const { register, enumerations } = useMessages();
  const words = register.sites;
  const members = people.filter(
    ({ id, retired }) => retired !== true && site.memberIds?.includes(id),
  );
  return (
    <Section id="site-members" title={words.members}>
      {members.length === 0 ? (
        <Text>{words.noMembers}</Text>
      ) : (
        <View role="list">
          {members.map(({ id, name, role }) => (
            <View role="listitem" key={id} style={styles.member}>
              <Text variant="answer" style={styles.grow}>
                {name}
              </Text>
              <Text color="ink2">{enumerations.role[role]}</Text>
            </View>
          ))}
        </View>
      )}
    </Section>
  );
}

interface Props {
  site: Site;
  people: readonly Person[];
  view: RegisterViewControl;
}

/** What the register says of one site. */
export function SitePanel({ site, people, view }: Props) {
  const { register, enumerations, common } = useMessages();
  const locale = useLocale();
  const words = register.sites;
  const zones: Readonly<Record<string, string>> = words.zones;
  const back = () => view.open({ id: site.id });
  if (view.act === 'retire' && !site.retired) {
    return (
      <RetireForm
        subject="sites"
        recordId={site.id}
        title={words.retireTitle(site.name)}
        body={words.retireBody}
        onDone={back}
        onCancel={back}
      />
    );
  }
  return (
    <>
      {view.done !== undefined && (
        <Notice live icon="sent">
          {view.done === 'added' ? words.saved(site.name) : register.saved}
        </Notice>
      )}
      <Buttons site={site} view={view} />
      <Facts
        facts={[
          {
            label: words.timeZone,
            value: zoneWord(zones, site.timeZone),
            note: site.timeZone,
          },
          {
            label: words.systems,
            value:
              site.systems.length === 0
                ? common.notKnown
                : list(
                    locale,
                    site.systems.map(
                      (system) => enumerations.system[system].split(', ')[0] ?? system,
                    ),
                  ),
          },
          ...(site.deskToTell === '' ? [] : [{ label: words.desk, value: site.deskToTell }]),
        ]}
      />
      <Plan site={site} />
      <View>
        <Panels site={site} />
        <Members site={site} people={people} />
      </View>
    </>
  );
}

const styles = StyleSheet.create({
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: 10 },
  grow: { flexGrow: 1, flexBasis: 150 },
  member: { flexDirection: 'row', gap: 12, paddingVertical: 6 },
});
