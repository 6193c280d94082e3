import { Text, View } from 'react-native';
import { useAnchorClick } from './navigation';
import { Label, textStyle } from './text';
import { useTheme } from './theme';
import { HAIRLINE_PX, ROW_MIN_PX, SIZES, SPACE, TITLE_LINE_HEIGHT } from './tokens';

export interface StripCell {
  label: string;
  value: string;
  /** Where this part of the question is changed. */
  href?: string;
}

export interface StripProps {
  label: string;
  cells: StripCell[];
}

/** The question in one line: equal cells, each a word and what it stands at. */
export function Strip({ label, cells }: StripProps) {
  const { colors } = useTheme();
  return (
    <View
      role="group"
      aria-label={label}
      style={{
        flexDirection: 'row',
        borderWidth: HAIRLINE_PX,
        borderColor: colors.line,
        backgroundColor: colors.sheet,
      }}
    >
      {cells.map((cell, index) => (
        <StripCellView key={cell.label} cell={cell} isFirst={index === 0} />
      ))}
    </View>
  );
}

function StripCellView({ cell, isFirst }: { cell: StripCell; isFirst: boolean }) {
  const { colors } = useTheme();
  const onClick = useAnchorClick(cell.href ?? '');
  return (
    <View
      href={cell.href}
      onClick={cell.href === undefined ? undefined : onClick}
      style={{
        flexGrow: 1,
        flexShrink: 1,
        flexBasis: 0,
        minWidth: 0,
        minHeight: ROW_MIN_PX,
        gap: 2,
        paddingHorizontal: SPACE.x2,
        paddingVertical: SPACE.x2,
        borderLeftWidth: isFirst ? 0 : HAIRLINE_PX,
        borderColor: colors.lineFaint,
      }}
    >
      <Label>{cell.label}</Label>
      <Text
        style={[
          textStyle('monoMedium', SIZES.small, TITLE_LINE_HEIGHT),
          { color: colors.ink, overflowWrap: 'anywhere' },
        ]}
      >
        {cell.value}
      </Text>
    </View>
  );
}
