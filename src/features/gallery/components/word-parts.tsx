import { View } from 'react-native';
import {
  Body,
  COLORS,
  Figure,
  HAIRLINE_PX,
  Heading,
  ICON_NAMES,
  Icon,
  Inline,
  Label,
  Link,
  SPACE,
  Small,
  Stack,
  useTheme,
} from '../../../ui';
import type { Colors, Scheme } from '../../../ui';
import { BothSchemes } from './both-schemes';

const COLOR_NAMES: (keyof Colors)[] = [
  'ground',
  'sheet',
  'ink',
  'inkSecond',
  'inkThird',
  'line',
  'lineFaint',
  'oxygen',
  'oxygenTint',
  'water',
  'waterTint',
];

export function WordParts() {
  return (
    <>
      <BothSchemes title="Colours">{(scheme) => <Swatches scheme={scheme} />}</BothSchemes>
      <BothSchemes title="Words">
        {() => (
          <Stack gap="x2">
            <Heading level={3}>Roasted hazelnuts, 200 g pouch, to Singapore</Heading>
            <Body>
              ends by{' '}
              <Body tone="water" weight="semibold">
                moisture
              </Body>{' '}
              on day 48 of 270
            </Body>
            <Body tone="second">Second ink, for what explains.</Body>
            <Body tone="third">Third ink, for what stands beside.</Body>
            <Small>Small: share of the resistance to each gas</Small>
            <Label>label: outside air</Label>
            <Body>
              A sentence with <Link href="/gallery">a link in it</Link>.
            </Body>
            <Link href="/gallery" isQuiet isStandalone>
              A quiet link by itself
            </Link>
          </Stack>
        )}
      </BothSchemes>
      <BothSchemes title="Figures">
        {() => (
          <Inline gap="x6" align="flex-end">
            <Figure value="515" unit="days" size="display" />
            <Figure value="15.8" unit="cm³/(m²·day·atm)" size="title" />
            <Figure value="98.5" unit="%" tone="oxygen" isStrong />
            <Figure value="0.42" unit="g/(m²·day)" size="small" tone="water" />
            <Figure value="12 / 5 / 60" unit="µm" size="label" tone="second" />
          </Inline>
        )}
      </BothSchemes>
      <BothSchemes title="Icons">
        {() => (
          <Inline gap="x4">
            {ICON_NAMES.map((name) => (
              <View key={name} style={{ width: 72, alignItems: 'center', gap: SPACE.x1 }}>
                <Icon name={name} />
                <Label>{name}</Label>
              </View>
            ))}
          </Inline>
        )}
      </BothSchemes>
    </>
  );
}

function Swatches({ scheme }: { scheme: Scheme }) {
  const { colors } = useTheme();
  return (
    <Inline gap="x3">
      {COLOR_NAMES.map((name) => (
        <View key={name} style={{ width: 88, gap: SPACE.x1 }}>
          <View
            style={{
              height: 32,
              borderWidth: HAIRLINE_PX,
              borderColor: colors.line,
              backgroundColor: COLORS[scheme][name],
            }}
          />
          <Label>{name}</Label>
          <Figure value={COLORS[scheme][name]} size="label" tone="second" />
        </View>
      ))}
    </Inline>
  );
}
