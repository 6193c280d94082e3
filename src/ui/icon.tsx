import Svg, { Path } from 'react-native-svg';
import { useTheme } from './theme';

/** Our own drawings on a field of 20 × 20, one stroke each. */
const PATHS = {
  studies: 'M2.5 17.5h15M5 17.5V10M8.5 17.5V4M12 17.5v-6M15.5 17.5V7',
  walls: 'M3 3.5h14v13H3zM7 3.5v13M10 3.5v13',
  materials: 'M3 6.5l7-3.5 7 3.5-7 3.5zM3 10l7 3.5 7-3.5M3 13.5L10 17l7-3.5',
  'lab-data': 'M3 3v14h14M5.5 13.5l3.5-4 3 2 4.5-6',
  reports: 'M4.5 2.5h8l3 3v12h-11zM12.5 2.5v3h3M7 9h6M7 12h6M7 15h4',
  account: 'M10 10a3.25 3.25 0 1 0 0-6.5 3.25 3.25 0 0 0 0 6.5zM3.5 17.5c.6-3.4 3-5 6.5-5s5.9 1.6 6.5 5',
  requests: 'M3 5.500h14v10H3zM3 6l7 5.500L17 6',
  team: 'M7.5 9.500a2.75 2.75 0 1 0 0-5.5 2.75 2.75 0 0 0 0 5.500zM2 16.500c.5-3 2.5-4.5 5.5-4.500s5 1.5 5.5 4.500M13 4.300a2.6 2.6 0 0 1 0 4.900M15 12.400c1.7.7 2.7 2 3 4.1',
  more: 'M4 10h.01M10 10h.01M16 10h.01',
  packs: 'M4.5 5.500h11v12h-11zM4.5 5.500l1.5-3h8l1.5 3M4.5 8h11',
  foods:
    'M10 6.500c-4-2-7 .5-6.5 4.5.4 3.5 3 6.5 6.5 6.500s6.1-3 6.5-6.500c.5-4-2.5-6.5-6.5-4.500zM10 6.500c0-2 1-3.5 3-4',
  routes:
    'M4.5 15.500h7a3 3 0 0 0 0-6h-3a3 3 0 0 1 0-6h7M13 1.500l2.5 2-2.5 2M4.5 17a1.5 1.5 0 1 0 0-3 1.5 1.5 0 0 0 0 3z',
  add: 'M10 4v12M4 10h12',
  remove: 'M5 5l10 10M15 5L5 15',
  up: 'M10 16.500v-13M5 8.500l5-5 5 5',
  down: 'M10 3.500v13M5 11.500l5 5 5-5',
  'turn-round': 'M3.5 7.500h12l-3-3.500M16.5 12.500h-12l3 3.5',
  duplicate: 'M7 7h9.500v9.500H7zM13 7V3.500H3.500V13H7',
  back: 'M12 4l-6 6 6 6',
  forward: 'M8 4l6 6-6 6',
  open: 'M4 7.500l6 6 6-6',
  minus: 'M4 10h12',
  check: 'M4 10.500l4 4 8-9',
} as const;

export type IconName = keyof typeof PATHS;

export const ICON_NAMES = Object.keys(PATHS).filter((name): name is IconName => name in PATHS);

export interface IconProps {
  name: IconName;
  sizePx?: number;
  color?: string;
}

/** Always beside a word or inside a part that has a name of its own, so it is hidden from readers. */
export function Icon({ name, sizePx = 20, color }: IconProps) {
  const { colors } = useTheme();
  return (
    <Svg width={sizePx} height={sizePx} viewBox="0 0 20 20" aria-hidden>
      <Path
        d={PATHS[name]}
        stroke={color ?? colors.ink}
        strokeWidth={name === 'more' ? 2.4 : 1.4}
        strokeLinecap={name === 'more' ? 'round' : 'square'}
        strokeLinejoin="miter"
        fill="none"
      />
    </Svg>
  );
}
