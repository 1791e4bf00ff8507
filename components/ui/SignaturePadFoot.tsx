import { Pressable, StyleSheet, View } from 'react-native';
import { radius, rule, touch } from '../theme/tokens';
import { useMessages } from '../i18n/useMessages';
import { Text } from './Text';

export const PAD_HEIGHT = 168;
/** The ink line stands this far above the foot. */
export const PAD_LINE = 46;

interface Props {
  name: string;
  time?: string;
  empty: boolean;
  onClear: () => void;
}

/** What is printed under the line, and Clear. */
export function PadFoot({ name, time, empty, onClear }: Props) {
  const { ui } = useMessages();
  return (
    <View style={padFrame.foot} pointerEvents="box-none">
      <Text variant="label" style={padFrame.name}>
        {time === undefined ? name : `${name}, ${time}`}
      </Text>
      {!empty && (
        <Pressable role="button" onPress={onClear} style={padFrame.clear}>
          <Text variant="strong" color="blue">
            {ui.clear}
          </Text>
        </Pressable>
      )}
    </View>
  );
}

export const padFrame = StyleSheet.create({
  box: {
    height: PAD_HEIGHT,
    borderWidth: rule.middle,
    borderRadius: radius.control,
    overflow: 'hidden',
  },
  line: { position: 'absolute', left: 16, right: 16, height: 2 },
  foot: {
    position: 'absolute',
    left: 16,
    right: 0,
    bottom: 0,
    height: touch.least,
    flexDirection: 'row',
    alignItems: 'center',
    justifyContent: 'space-between',
  },
  name: { flexShrink: 1 },
  clear: {
    minHeight: touch.least,
    minWidth: 72,
    alignItems: 'flex-end',
    justifyContent: 'center',
    paddingHorizontal: 16,
  },
});
