import { View } from 'react-native';
import { Text } from '../ui';

interface Props {
  first: string;
  second: string | undefined;
  /** Its time is over: the second line says so in the colour of danger. */
  over?: boolean;
  /** On a phone, one after the other. */
  inLine?: boolean;
}

/** A date and what follows from it. */
export function TwoLines({ first, second, over, inLine }: Props) {
  if (inLine === true) {
    return (
      <Text variant="note">
        {first}
        {second !== undefined && (
          <Text variant="note" weight="600" color={over === true ? 'redText' : 'ink'}>
            {`. ${second}`}
          </Text>
        )}
      </Text>
    );
  }
  return (
    <View>
      <Text variant="note" weight={over === true ? '600' : '400'}>
        {first}
      </Text>
      {second !== undefined && (
        <Text
          variant="label"
          weight={over === true ? '600' : '400'}
          color={over === true ? 'redText' : 'ink2'}
        >
          {second}
        </Text>
      )}
    </View>
  );
}
