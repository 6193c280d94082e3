import { View } from 'react-native';
import { useTheme } from './theme';
import { HAIRLINE_PX } from './tokens';

export function Divider({ isFaint = false }: { isFaint?: boolean }) {
  const { colors } = useTheme();
  return <View style={{ height: HAIRLINE_PX, backgroundColor: isFaint ? colors.lineFaint : colors.line }} />;
}
