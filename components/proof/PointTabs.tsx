import { Pressable, StyleSheet, View } from 'react-native';
import { radius, rule, touch } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { useMessages } from '../i18n/useMessages';
import { Text, webProps } from '../ui';

export interface PointTab {
  name: string;
  taken: number;
  all: number;
}

interface Props {
  points: readonly PointTab[];
  chosen: number;
  onChoose: (place: number) => void;
  panelId: string;
}

const PER_ROW = 4;

/** The points of work, each with how many of its readings are taken. */
export function PointTabs({ points, chosen, onChoose, panelId }: Props) {
  const words = useMessages().proof.readings;
  const { colors } = useTheme();
  const perRow = Math.min(PER_ROW, points.length);
  return (
    <View
      role="tablist"
      aria-label={words.points}
      style={[styles.tabs, { borderColor: colors.blue, backgroundColor: colors.field }]}
    >
      {points.map(({ name, taken, all }, place) => {
        const here = place === chosen;
        return (
          <Pressable
            key={place}
            role="tab"
            aria-selected={here}
            {...webProps({ 'aria-controls': panelId })}
            onPress={() => onChoose(place)}
            style={[
              styles.tab,
              { width: `${100 / perRow}%` },
              here && { backgroundColor: colors.blue },
              place % perRow > 0 && { borderLeftWidth: rule.middle, borderLeftColor: colors.blue },
              place >= perRow && { borderTopWidth: rule.middle, borderTopColor: colors.blue },
            ]}
          >
            <Text variant="strong" weight="700" color={here ? 'onBlue' : 'blue'} numberOfLines={1}>
              {name}
            </Text>
            <Text variant="label" color={here ? 'onBlue' : 'blue'}>
              {words.of(taken, all)}
            </Text>
          </Pressable>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  tabs: {
    flexDirection: 'row',
    flexWrap: 'wrap',
    borderWidth: rule.middle,
    borderRadius: radius.control,
    overflow: 'hidden',
  },
  tab: {
    minHeight: touch.act,
    paddingHorizontal: 12,
    paddingVertical: 6,
    justifyContent: 'center',
  },
});
