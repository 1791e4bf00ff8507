import Svg, { Circle, Path } from 'react-native-svg';
import { View } from 'react-native';
import type { ColorName } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { iconPaths, markLine, type IconName } from './icons';

interface Props {
  name: IconName;
  size?: number;
  color?: ColorName;
  /** px at the drawn size; 2 unless the icon is set larger or bolder. */
  strokeWidth?: number;
}

/** A symbol. Decoration for a screen reader: its word always stands beside it. */
export function Icon({ name, size = 24, color = 'ink', strokeWidth = 2 }: Props) {
  const { colors } = useTheme();
  return (
    <View aria-hidden style={{ width: size, height: size, flexShrink: 0 }}>
      <Svg width={size} height={size} viewBox="0 0 24 24" fill="none">
        <Path
          d={iconPaths[name]}
          stroke={colors[color]}
          strokeWidth={strokeWidth}
          strokeLinecap="square"
          strokeLinejoin="miter"
        />
      </Svg>
    </View>
  );
}

/** The mark; at least 20 wide, in ink or paper only. */
export function Mark({ width = 32, color = 'ink' }: { width?: number; color?: ColorName }) {
  const { colors } = useTheme();
  const height = (width * 18) / 32;
  return (
    <View aria-hidden style={{ width, height, flexShrink: 0 }}>
      <Svg width={width} height={height} viewBox="0 10.5 32 18" fill="none">
        <Path d={markLine} stroke={colors[color]} strokeWidth={3} />
        <Circle cx={16} cy={23.5} r={3.5} fill={colors[color]} />
      </Svg>
    </View>
  );
}
