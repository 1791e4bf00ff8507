import { Text as NativeText, type TextProps, type TextStyle } from 'react-native';
import { font, smallCaps, type FontWeight } from '../theme/fonts';
import { tabular, typeScale, type TextVariant, type TypeStyle } from '../theme/type';
import type { ColorName } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';
import { webProps } from './webProps';

export interface UiTextProps extends TextProps {
  variant?: TextVariant;
  color?: ColorName;
  weight?: FontWeight;
  /** Makes it a heading of that level. */
  level?: 1 | 2 | 3 | 4;
  /** The language of this text where it is not the page's. */
  lang?: string;
}

/** Size, line, weight and tabular digits of one variant, for text drawn elsewhere (svg, inputs). */
export function textStyle(variant: TextVariant, weight?: FontWeight): TextStyle {
  const type: TypeStyle = typeScale[variant];
  return {
    ...font(weight ?? type.weight),
    fontSize: type.size,
    lineHeight: type.line,
    ...(variant === 'smallCaps' ? smallCaps : tabular),
    ...(type.tracking !== undefined && { letterSpacing: type.tracking * type.size }),
  };
}

/** All text of the product. Everything read goes through here. */
export function Text({
  variant = 'body',
  color = 'ink',
  weight,
  level,
  lang,
  style,
  ...rest
}: UiTextProps) {
  const { colors } = useTheme();
  return (
    <NativeText
      {...(level !== undefined && webProps({ role: 'heading', 'aria-level': level }))}
      {...(lang !== undefined && webProps({ lang }))}
      {...rest}
      style={[textStyle(variant, weight), { color: colors[color] }, style]}
    />
  );
}
