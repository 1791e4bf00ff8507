import { router } from 'expo-router';
import { useState } from 'react';
import { StyleSheet, View } from 'react-native';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import { Button, ErrorSummary, Form, Text, TextField, type FieldFault } from '../ui';
import { readPaper, type Paper, type PaperFault } from './papers';
import { VerifyFrame } from './VerifyFrame';

const NUMBER_FIELD = 'paper-number';
const CODE_FIELD = 'paper-code';

/** What was wrong at the last try: it stands still while it is mended. */
function useFaults(tried: Paper | undefined): { number?: string; hash?: string } {
  const { verify } = useMessages();
  if (tried === undefined) return {};
  const { faults, hash } = readPaper(tried);
  const words: Readonly<Record<PaperFault, string>> = {
    number: verify.notANumber,
    'code-length': verify.codeLength(hash.length),
    'code-letters': verify.codeLetters,
  };
  const ofCode = faults.find((fault) => fault !== 'number');
  return {
    number: faults.includes('number') ? words.number : undefined,
    hash: ofCode === undefined ? undefined : words[ofCode],
  };
}

/** Number and code, typed from a paper. */
export function VerifyFormScreen({ initial }: { initial?: Partial<Paper> }) {
  const { verify } = useMessages();
  const [typed, setTyped] = useState<Paper>({ number: '', hash: '', ...initial });
  const [tried, setTried] = useState<Paper>();
  const errors = useFaults(tried);
  const faults: FieldFault[] = [
    ...(errors.number === undefined ? [] : [{ id: NUMBER_FIELD, message: errors.number }]),
    ...(errors.hash === undefined ? [] : [{ id: CODE_FIELD, message: errors.hash }]),
  ];

  function handleSubmit() {
    setTried(typed);
    const paper = readPaper(typed);
    if (paper.faults.length > 0) return;
    const { number, hash } = paper;
    router.push({ pathname: '/verify/[number]/[hash]', params: { number, hash } });
  }

  return (
    <VerifyFrame title={verify.title}>
      <Text>{verify.lead}</Text>
      <Form label={verify.title}>
        <View style={styles.form}>
          <ErrorSummary faults={faults} />
          <TextField
            id={NUMBER_FIELD}
            label={verify.number}
            hint={verify.numberHint}
            value={typed.number}
            error={errors.number}
            exact
            inputMode="text"
            maxLength={40}
            onChangeText={(number) => setTyped({ ...typed, number })}
            onSubmitEditing={handleSubmit}
          />
          <TextField
            id={CODE_FIELD}
            label={verify.code}
            hint={verify.codeHint}
            value={typed.hash}
            error={errors.hash}
            exact
            multiline
            maxLength={200}
            onChangeText={(hash) => setTyped({ ...typed, hash })}
          />
          <Button kind="primary" large icon="search" label={verify.check} onPress={handleSubmit} />
        </View>
      </Form>
    </VerifyFrame>
  );
}

const styles = StyleSheet.create({ form: { gap: space.lg } });
