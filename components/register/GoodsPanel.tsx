import { StyleSheet, View } from 'react-native';
import { citation } from '@/hazard';
import { dateText } from '@/shared/format';
import type { RubberGoods } from '@/shared/register';
import { dueDay, goodsState, latestTest } from '@/shared/registerState';
import { useUser } from '../api/session';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { Button, Citation, describeFault, Facts, Notice, Section, StopPanel, Text } from '../ui';
import { useSaveRecord } from './registerMutations';
import { RetireForm } from './RetireForm';
import { TestForm } from './TestForm';
import { UsedOn } from './UsedOn';
import type { RegisterViewControl } from './useRegisterView';

/** Why it may not be used now, before anything else. */
function Stops({ item, today }: { item: RubberGoods; today: string }) {
  const { register } = useMessages();
  const locale = useLocale();
  const words = register.goods;
  const state = goodsState(item, today);
  const cited = <Citation citation={citation('osha1910.137.tableI-5')} />;
  if (state === 'overdue') {
    return (
      <StopPanel
        title={words.ranOut(item.serial, dateText(locale, item.dueOn))}
        body={words.ranOutTodo}
        citation={cited}
      />
    );
  }
  if (state !== 'out') return null;
  return latestTest(item)?.passed === false ? (
    <StopPanel title={words.failedTitle(item.serial)} body={words.failedTodo} />
  ) : (
    <StopPanel title={words.outTitle(item.serial)} body={words.outTodo} citation={cited} />
  );
}

function Buttons({ item, view }: { item: RubberGoods; view: RegisterViewControl }) {
  const messages = useMessages();
  const { register } = messages;
  const { id } = item;
  const save = useSaveRecord('goods', { id: id });
  if (item.retired) {
    // What failed a test never comes back; what was lost may be found.
    if (item.retiredBecause === 'failed test') return null;
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
        icon="check"
        label={register.goods.recordTest}
        style={styles.grow}
        onPress={() => view.open({ id, act: 'test' })}
      />
      <Button
        label={register.goods.retireItem}
        style={styles.grow}
        onPress={() => view.open({ id, act: 'retire' })}
      />
      <Button
        icon="pen"
        label={register.edit}
        style={styles.grow}
        onPress={() => view.open({ id, act: 'edit' })}
      />
    </View>
  );
}

function Dates({ item }: { item: RubberGoods }) {
  const { register } = useMessages();
  const locale = useLocale();
  const words = register.goods;
  const day = (date: string) => dateText(locale, date);
  const due = dueDay(item);
  return (
    <Section id="goods-dates" title={words.follows}>
      <Facts
        facts={[
          {
            label: words.lastTest,
            value: item.lastTestedOn === '' ? words.notTested : day(item.lastTestedOn),
          },
          {
            label: words.issued,
            value: item.issuedOn === null ? words.inStore : day(item.issuedOn),
          },
          ...(due === undefined ? [] : [{ label: words.due, value: day(due) }]),
        ]}
      />
      <Citation citation={[citation('osha1910.137.tableI-4'), citation('osha1910.137.tableI-5')]} />
    </Section>
  );
}

function Tests({ item }: { item: RubberGoods }) {
  const { register } = useMessages();
  const locale = useLocale();
  const words = register.goods;
  const latestFirst = [...item.tests].sort((one, other) =>
    other.testedOn.localeCompare(one.testedOn),
  );
  return (
    <Section id="goods-tests" title={words.tests}>
      <Facts
        facts={latestFirst.map(({ testedOn, passed, laboratory }) => {
          const result = passed ? words.passed : words.failed;
          return {
            label: dateText(locale, testedOn),
            value: laboratory === undefined ? result : words.testLine(result, laboratory),
          };
        })}
      />
      <Text variant="label" weight="400" color="ink2">
        {words.testsNote}
      </Text>
    </Section>
  );
}

interface Props {
  item: RubberGoods;
  today: string;
  view: RegisterViewControl;
}

/** One item: whether it may be used, why its day is that day, and every test it had. */
export function GoodsPanel({ item, today, view }: Props) {
  const { register } = useMessages();
  const { role } = useUser();
  const words = register.goods;
  const mayWrite = role === 'safety';
  const back = () => view.open({ id: item.id });
  if (mayWrite && view.act === 'retire' && !item.retired) {
    return (
      <RetireForm
        subject="goods"
        recordId={item.id}
        title={words.retireTitle(item.serial)}
        body={words.retireBody}
        onDone={back}
        onCancel={back}
      />
    );
  }
  if (mayWrite && view.act === 'test' && !item.retired) {
    return (
      <TestForm
        item={item}
        today={today}
        onDone={() => view.open({ id: item.id, done: 'test' })}
        onCancel={back}
      />
    );
  }
  const done = { added: words.saved(item.serial), test: words.testSaved(item.serial) };
  return (
    <>
      {view.done !== undefined && (
        <Notice live icon="sent">
          {view.done === 'added' || view.done === 'test' ? done[view.done] : register.saved}
        </Notice>
      )}
      <Stops item={item} today={today} />
      {mayWrite && <Buttons item={item} view={view} />}
      <View>
        <Dates item={item} />
        <Tests item={item} />
        {item.kind === 'gloves' && <UsedOn by="rubberGoods" id={item.id} />}
      </View>
    </>
  );
}

const styles = StyleSheet.create({
  buttons: { flexDirection: 'row', flexWrap: 'wrap', gap: 10 },
  grow: { flexGrow: 1, flexBasis: 150 },
});
