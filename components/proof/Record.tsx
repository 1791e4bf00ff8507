import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { ApiProblem, isProblem } from '../api/ApiProblem';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, Notice, PinField, StateMark, Text, describeFault } from '../ui';
import { usePinFault } from '../signing/SigningProblem';
import { FindingPanels } from '../worksheet/parts/FindingPanels';
import { FoldedPoints } from '../worksheet/parts/PointsList';
import { MOST_READINGS, hasUnreadable, pointNames } from './proofForm';
import type { ProofState } from './useProof';
import { useRecordProof } from './useRecordProof';

const PIN_LENGTH = 6;

interface Props {
  state: ProofState;
  onRecorded: (recorded: { at: string; proved: boolean }) => void;
}

/** What cannot be recorded as it stands, whatever it proves. */
function useUnrecordable({ form, plan, proof }: ProofState): string | undefined {
  const said = useMessages().proof.readings;
  const names = pointNames(form, plan);
  if (hasUnreadable(form)) return said.notANumber;
  if (new Set(names).size < names.length) return said.sameName;
  return (proof.readings?.length ?? 0) > MOST_READINGS ? said.tooMany(MOST_READINGS) : undefined;
}

/** 9. The PIN, and one button that says what it records. */
export function Record({ state, onRecorded }: Props) {
  const words = useMessages();
  const said = words.proof.record;
  const [pin, setPin] = useState('');
  const { record, form, proof, left, hasVoltage, findingsOf } = state;
  const post = useRecordProof(record.id);
  const pinFault = usePinFault(post.error);
  const unrecordable = useUnrecordable(state);
  const stray = left.some(({ code }) => code === 'absence.stray-voltage');
  const others = findingsOf('record');
  const pinMissing = pin.length < PIN_LENGTH ? said.missingPin : undefined;

  const send = () =>
    post.mutate(
      { id: form.id, proof, pin },
      {
        onSuccess: ({ at, assessment }) => {
          setPin('');
          onRecorded({ at, proved: assessment.verdict === 'ready' });
        },
      },
    );
  const common = { large: true, busy: post.isPending, onPress: send } as const;
  return (
    <View style={styles.box}>
      <Text color="ink2">{said.note}</Text>
      {others.length > 0 && (
        <>
          <Text variant="strong">{said.others}</Text>
          <FindingPanels findings={others} />
        </>
      )}
      <FoldedPoints findings={left} />
      {left.length === 0 && <StateMark state="ready" word={said.ready} />}
      <PinField
        id="proof-pin"
        value={pin}
        onChange={(next) => {
          setPin(next);
          if (pinFault !== undefined) post.reset();
        }}
        error={pinFault}
      />
      {post.error !== null && pinFault === undefined && (
        <Notice live icon="kept">
          {isProblem(post.error, 'wrong-state')
            ? said.moved
            : post.error instanceof ApiProblem
              ? describeFault(post.error, words)
              : said.offline}
        </Notice>
      )}
      {hasVoltage ? (
        <Button
          {...common}
          kind="primary"
          icon="refuse"
          label={said.stop}
          reason={unrecordable ?? pinMissing}
        />
      ) : (
        <Button
          {...common}
          kind="primary"
          icon={left.length === 0 && pinMissing === undefined ? 'seal' : undefined}
          label={said.proved}
          reason={left.length > 0 ? said.open(left.length) : (unrecordable ?? pinMissing)}
        />
      )}
      {stray && !hasVoltage && (
        <>
          <Button {...common} label={said.notProved} reason={unrecordable ?? pinMissing} />
          <Text variant="label" weight="400" color="ink2">
            {said.notProvedNote}
          </Text>
        </>
      )}
    </View>
  );
}

const styles = StyleSheet.create({ box: { gap: space.md } });
