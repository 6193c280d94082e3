import { View } from 'react-native';
import { Body, Divider, Figure, IconButton, Row, Sheet, Strip, TitleBlock } from '../../../ui';
import { BothSchemes } from './both-schemes';

export function LayoutParts() {
  return (
    <>
      <BothSchemes title="Sheet, strip, rows, title block">
        {() => (
          <>
            <Strip
              label="Question"
              cells={[
                { label: 'food', value: '200 g' },
                { label: 'pack', value: '720 cm²' },
                { label: 'route', value: '3 legs', href: '/gallery' },
                { label: 'target', value: '270 d' },
              ]}
            />
            <Sheet
              title="Who holds what"
              subtitle="share of the resistance to each gas"
              level={3}
              action={<IconButton icon="turn-round" label="Turn the wall round" onPress={() => undefined} />}
            >
              <View>
                <Row label="PET 12" value={<Figure value="1.4" unit="%" />} />
                <Row
                  label="EVOH 5"
                  detail="dry core, 0.31 to 0.47 water activity"
                  value={<Figure value="98.5" unit="%" />}
                />
                <Row label="PE 60" value={<Figure value="0.1" unit="%" />} isLast />
              </View>
            </Sheet>
            <Sheet>
              <Row label="A row that leads on" detail="with what it holds" href="/gallery" />
              <Row label="The row one is at" href="/gallery" isCurrent />
              <Row label="A row that acts" onPress={() => undefined} isLast />
            </Sheet>
            <Divider />
            <Body tone="second">Between a hairline and a fainter one.</Body>
            <Divider isFaint />
            <TitleBlock
              label="Made from"
              cells={[
                { label: 'study', value: 'Roasted hazelnuts, 200 g' },
                { label: 'route', value: '25/60 · 30/75 · 23/50' },
                { label: 'engine', value: '1.0.0' },
                { label: 'data from memory', value: '2 of 9 layers' },
              ]}
            />
          </>
        )}
      </BothSchemes>
    </>
  );
}
