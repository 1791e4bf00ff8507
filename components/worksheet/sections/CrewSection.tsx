import { useFieldArray, useFormContext } from 'react-hook-form';
import { StyleSheet, View } from 'react-native';
import { BRIEFING_TOPICS, CLOSEST } from '@/hazard';
import { dateText } from '@/shared/format';
import type { Person } from '@/shared/user';
import { useLocale } from '../../i18n/preferences';
import { useMessages } from '../../i18n/useMessages';
import { space } from '../../theme/tokens';
import { useTheme } from '../../theme/useTheme';
import { Button, CheckRow, FirstAidPanel, Select, StateMark, Text } from '../../ui';
import { FieldCheck } from '../form/FieldCheck';
import { FieldSelect, FieldText, FieldYesNo } from '../form/fields';
import { toggled, useListField } from '../form/useListField';
import { useShowField } from '../form/shownFields';
import { wordOf } from '../form/fieldWords';
import { useFieldState, useWorksheetForm } from '../form/WorksheetFormContext';
import { FindingPanels } from '../parts/FindingPanels';
import { SectionFrame } from '../parts/SectionFrame';
import { Suggestions } from '../parts/Suggestions';
import { usePeople } from '../registerQueries';

const MOST_CREW = 40;
const EMERGENCY = ['contact', 'rescue', 'firstAid', 'aedAt'] as const;

function nextId(ids: readonly (string | undefined)[]): string {
  const numbers = ids.map((id) => Number(/^c(\d+)$/.exec(id ?? '')?.[1] ?? 0));
  return `c${Math.max(0, ...numbers) + 1}`;
}

/** The register's word on a person: qualified until when. The server puts it in again. */
function Qualification({
  qualified,
  through,
}: {
  qualified: boolean | undefined;
  through: string | undefined;
}) {
  const words = useMessages().worksheet;
  const locale = useLocale();
  const text =
    qualified !== true
      ? words.notQualified
      : through === undefined
        ? words.qualifiedUnknown
        : words.qualifiedThrough(dateText(locale, through));
  return <Text variant="label">{text}</Text>;
}

function Member({ index, onRemove }: { index: number; onRemove: () => void }) {
  const words = useMessages().worksheet;
  const { colors } = useTheme();
  const { content, record } = useWorksheetForm();
  const { findings } = useFieldState(`crew.${index}`);
  const member = content.crew?.[index] ?? {};
  const at = (field: string) => `crew.${index}.${field}`;
  const own = member.userId === record.leadId;
  useShowField(`crew.${index}`);
  return (
    <View style={[styles.member, { borderTopColor: colors.hair }]}>
      <View>
        <Text variant="value">{member.name ?? words.namelessMember}</Text>
        <Qualification qualified={member.qualified} through={member.qualifiedThrough} />
      </View>
      {member.userId === undefined && <FieldText name={at('name')} />}
      <FindingPanels findings={findings} />
      <FieldSelect name={at('closest')} values={CLOSEST} group="closest" />
      <FieldYesNo name={at('worksOnCircuit')} />
      <View>
        <FieldCheck name={at('lead')} />
        <FieldCheck name={at('arcRated')} />
        <FieldCheck name={at('rescueTrained')} />
      </View>
      <FieldFindings name={at('qualified')} />
      <FieldFindings name={at('qualifiedThrough')} />
      {!own && (
        <Button
          kind="quiet"
          icon="close"
          label={words.removeMember(member.name ?? words.namelessMember)}
          onPress={onRemove}
        />
      )}
    </View>
  );
}

function FieldFindings({ name }: { name: string }) {
  const { findings } = useFieldState(name);
  useShowField(name);
  return <FindingPanels findings={findings} />;
}

/** A person of the site's register; without an account nobody can sign. */
function AddMember({ onAdd }: { onAdd: (person: Person) => void }) {
  const words = useMessages();
  const people = usePeople();
  const { content, site } = useWorksheetForm();
  const named = new Set((content.crew ?? []).map(({ userId }) => userId));
  const offered = people.filter(
    ({ id, role, retired, siteIds }) =>
      !named.has(id) &&
      retired !== true &&
      (role === 'lead' || role === 'helper') &&
      (site === undefined || siteIds === undefined || siteIds.includes(site.id)),
  );
  return (
    <Select
      label={words.worksheet.addMember}
      value={undefined}
      onChange={(id: string) => {
        const person = people.find((each) => each.id === id);
        if (person !== undefined) onAdd(person);
      }}
      options={offered.map(({ id, name, role, qualified }) => ({
        value: id,
        label: name,
        note: [
          wordOf(words, 'role', role),
          qualified ? words.worksheet.qualified : words.worksheet.notQualified,
        ].join(', '),
        icon: 'person' as const,
      }))}
    />
  );
}

function Topics() {
  const words = useMessages();
  const { assessment } = useWorksheetForm();
  const { findings } = useFieldState('briefing.topics');
  const [covered, change] = useListField<string>('briefing.topics');
  useShowField('briefing.topics');
  const asked = BRIEFING_TOPICS.filter(
    (topic) => topic !== 'permit' || assessment.permit.required || covered.includes(topic),
  );
  const others = findings.filter(({ severity }) => severity !== 'open');
  return (
    <View>
      <Text variant="strong">{words.fields['briefing.topics']}</Text>
      {asked.map((topic) => {
        const { name, say } = words.topics[topic];
        return (
          <CheckRow
            key={topic}
            label={name}
            note={say}
            checked={covered.includes(topic)}
            unanswered={!covered.includes(topic)}
            onChange={(now) => change((list) => toggled(list, topic, now))}
          />
        );
      })}
      <FindingPanels findings={others} />
    </View>
  );
}

function Emergency() {
  const words = useMessages();
  const { site, content } = useWorksheetForm();
  const { setValue } = useFormContext();
  const plan = content.briefing?.emergency ?? {};
  return (
    <>
      <Text variant="strong">{words.worksheet.emergencyPlan}</Text>
      {EMERGENCY.map((field) => {
        const known = site?.emergency[field];
        const name = `briefing.emergency.${field}`;
        return (
          <View key={field} style={styles.plan}>
            <FieldText name={name} />
            <Suggestions
              from={words.worksheet.fromSite}
              values={known === undefined || known === '' || known === plan[field] ? [] : [known]}
              onTake={(value) => setValue(name, value, { shouldDirty: true })}
            />
          </View>
        );
      })}
      <FieldFindings name="briefing.emergency" />
    </>
  );
}

function CrewSummary() {
  const words = useMessages();
  const { content } = useWorksheetForm();
  const plan = content.briefing?.emergency ?? {};
  const rows = [
    plan.contact && { icon: 'phone' as const, text: plan.contact },
    plan.rescue && { icon: 'ladder' as const, text: plan.rescue },
    plan.firstAid && { icon: 'person' as const, text: plan.firstAid },
    plan.aedAt && { icon: 'aed' as const, text: plan.aedAt },
  ].filter((row) => typeof row === 'object');
  return (
    <>
      {(content.crew ?? []).map((member, index) => (
        <View key={member.id ?? index} style={styles.summary}>
          <Text variant="answer">{member.name ?? words.worksheet.namelessMember}</Text>
          <Qualification qualified={member.qualified} through={member.qualifiedThrough} />
          {member.closest !== undefined && (
            <Text variant="label">{wordOf(words, 'closest', member.closest)}</Text>
          )}
        </View>
      ))}
      <StateMark
        state={content.briefing?.topics === undefined ? 'open' : 'complete'}
        word={words.worksheet.topicsCovered(content.briefing?.topics?.length ?? 0)}
      />
      {rows.length > 0 && <FirstAidPanel rows={rows} />}
    </>
  );
}

/** 10. Who is there, how close each may come, what was said, and what is done after an accident. */
export function CrewSection() {
  const { content } = useWorksheetForm();
  const { fields, append, remove } = useFieldArray({ name: 'crew', keyName: 'key' });
  const addPerson = (person: Person) =>
    append({
      id: nextId((content.crew ?? []).map(({ id }) => id)),
      userId: person.id,
      name: person.name,
      qualified: person.qualified,
      ...(person.qualifiedThrough !== null && { qualifiedThrough: person.qualifiedThrough }),
      lead: false,
    });
  return (
    <SectionFrame section="crew" folded={<CrewSummary />}>
      <View style={styles.members}>
        {fields.map((field, index) => (
          <Member key={field.key} index={index} onRemove={() => remove(index)} />
        ))}
      </View>
      {fields.length < MOST_CREW && <AddMember onAdd={addPerson} />}
      <FieldFindings name="crew" />
      <Topics />
      <Emergency />
    </SectionFrame>
  );
}

const styles = StyleSheet.create({
  members: { gap: space.md },
  member: { gap: space.md, paddingTop: space.sm, borderTopWidth: 1 },
  plan: { gap: space.xs },
  summary: { paddingVertical: space.xxs },
});
