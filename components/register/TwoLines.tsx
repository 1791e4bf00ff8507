import { View } from 'react-native';
import { Text } from '../ui';

interface Props {
  first: string;
  second: string | undefined;
  /** Which line says that its time is over, in the colour of danger. */
  over?: 'first' | 'second';
  /** The first line is what the list is read for. */
  strong?: boolean;
  /** On a phone, one after the other. */
  inLine?: boolean;
}

/** A date or a state, and what follows from it. */
export function TwoLines({ first, second, over, strong, inLine }: Props) {
  const red = (line: 'first' | 'second') => over === line;
  const heavy = strong === true || red('first') ? '600' : '400';
  const start = (
    <Text variant="note" weight={heavy} color={red('first') ? 'redText' : 'ink'}>
      {first}
    </Text>
  );
  if (inLine === true) {
    return (
      <Text variant="note">
        {start}
        {second !== undefined && (
          <Text
            variant="note"
            weight={red('second') ? '600' : '400'}
            color={red('second') ? 'redText' : 'ink2'}
          >
            {`. ${second}`}
          </Text>
        )}
      </Text>
    );
  }
  return (
    <View>
      {start}
      {second !== undefined && (
        <Text
          variant="label"
          weight={red('second') ? '600' : '400'}
          color={red('second') ? 'redText' : 'ink2'}
        >
          {second}
        </Text>
      )}
    </View>
  );
}
