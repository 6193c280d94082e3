import { Text, View } from 'react-native';
import { Label, textStyle } from './text';
import { useTheme } from './theme';
import { HAIRLINE_PX, SIZES, SPACE, TEXT_LINE_HEIGHT } from './tokens';

export interface TitleBlockCell {
  label: string;
  value: string;
}

export interface TitleBlockProps {
  /** What it belongs to, for readers: 'Made from'. */
  label: string;
  cells: TitleBlockCell[];
}

const CHARACTER_PX = 7.6;

/** Room for the whole value on one line where there is room at all. */
function cellWidthPx({ value }: TitleBlockCell): number {
  return Math.min(Math.max(value.length * CHARACTER_PX + 2 * SPACE.x3, 104), 280);
}

/** Closes a study or a report: what it was made from, in ruled cells. */
export function TitleBlock({ label, cells }: TitleBlockProps) {
  const { colors } = useTheme();
  return (
    <View
      role="group"
      aria-label={label}
      style={{
        flexDirection: 'row',
        flexWrap: 'wrap',
        borderWidth: HAIRLINE_PX,
        borderColor: colors.ink,
        backgroundColor: colors.sheet,
        overflow: 'hidden',
      }}
    >
      {cells.map((cell) => (
        <View
          key={cell.label}
          style={{
            flexGrow: 1,
            flexShrink: 1,
            flexBasis: cellWidthPx(cell),
            minWidth: 0,
            gap: 2,
            paddingHorizontal: SPACE.x3,
            paddingVertical: SPACE.x2,
            // Ruled on all inner sides, however the cells wrap; the outer ones lie under the frame.
            borderRightWidth: HAIRLINE_PX,
            borderBottomWidth: HAIRLINE_PX,
            marginRight: -HAIRLINE_PX,
            marginBottom: -HAIRLINE_PX,
            borderColor: colors.line,
          }}
        >
          <Label>{cell.label}</Label>
          <Text
            style={[
              textStyle('mono', SIZES.small, TEXT_LINE_HEIGHT),
              { color: colors.ink, overflowWrap: 'anywhere' },
            ]}
          >
            {cell.value}
          </Text>
        </View>
      ))}
    </View>
  );
}
