import { memo } from 'react';
import Svg, { Circle, Path, Text as SvgText } from 'react-native-svg';
import {
  dotsPath,
  hatchPath,
  ROLE_TOKENS,
  type Drawing,
  type Primitive,
  type Role,
  type TextPrimitive,
} from '@/shared/drawing/primitives';
import { font } from '../theme/fonts';
import type { Colors } from '../theme/tokens';
import { useTheme } from '../theme/useTheme';

function colorOf(colors: Colors, role: Role | undefined): string {
  return role === undefined ? 'none' : colors[ROLE_TOKENS[role]];
}

/** Figures of one width; react-native-svg's types know no font features. */
const tabular: object = { style: { fontVariant: 'tabular-nums' } };

function Label({ text, colors }: { text: TextPrimitive; colors: Colors }) {
  const { fontFamily, fontWeight } = font(`${text.weight}`);
  const common = {
    fontFamily,
    ...(fontWeight !== undefined && { fontWeight: text.weight }),
    x: text.x,
    y: text.y,
    textAnchor: text.anchor,
    fontSize: text.size,
  };
  return (
    <>
      {/* The outline is a text of its own: paint-order does not exist on every target. */}
      {text.halo > 0 && (
        <SvgText
          {...common}
          {...tabular}
          fill={colors.paper}
          stroke={colors.paper}
          strokeWidth={text.halo}
          strokeLinejoin="round"
        >
          {text.text}
        </SvgText>
      )}
      <SvgText {...common} {...tabular} fill={colorOf(colors, text.role)}>
        {text.text}
      </SvgText>
    </>
  );
}

function Shape({ shape, colors }: { shape: Primitive; colors: Colors }) {
  switch (shape.kind) {
    case 'text':
      return <Label text={shape} colors={colors} />;
    case 'hatch':
      return (
        <Path
          d={hatchPath(shape.segments)}
          stroke={colorOf(colors, shape.role)}
          strokeWidth={shape.width}
        />
      );
    case 'dots':
      return (
        <Path
          d={dotsPath(shape.points)}
          stroke={colorOf(colors, shape.role)}
          strokeWidth={shape.radius * 2}
          strokeLinecap="round"
        />
      );
    case 'circle':
      return (
        <Circle
          cx={shape.cx}
          cy={shape.cy}
          r={shape.r}
          fill={colorOf(colors, shape.fill)}
          stroke={colorOf(colors, shape.stroke)}
          strokeWidth={shape.width ?? 0}
        />
      );
    case 'path':
      return (
        <Path
          d={shape.d}
          fill={colorOf(colors, shape.fill)}
          stroke={colorOf(colors, shape.stroke)}
          strokeWidth={shape.width ?? 0}
          {...(shape.dash && { strokeDasharray: shape.dash.join(' ') })}
          {...(shape.round && { strokeLinecap: 'round', strokeLinejoin: 'round' })}
        />
      );
  }
}

/** Draws what the geometry made, in the colours of the theme. It decides nothing itself. */
export const DrawingView = memo(function DrawingView({ drawing }: { drawing: Drawing }) {
  const { colors } = useTheme();
  const { width, height, primitives } = drawing;
  return (
    <Svg width={width} height={height} viewBox={`0 0 ${width} ${height}`} fill="none">
      {primitives.map((shape, index) => (
        // The order is the drawing's own; nothing keeps its place between two drawings.
        <Shape key={index} shape={shape} colors={colors} />
      ))}
    </Svg>
  );
});
