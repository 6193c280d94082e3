import { View } from 'react-native';
import type { DemoPerson } from '../../../session/session-requests';
import { Body, Button, Divider, Figure, SPACE, Sheet, Small } from '../../../ui';

export interface DemoPeopleProps {
  people: DemoPerson[];
  onChoose: (person: DemoPerson) => void;
}

export function DemoPeople({ people, onChoose }: DemoPeopleProps) {
  return (
    <Sheet
      title="Demo people"
      subtitle="Invented, and only on this machine. Each sees what their role may see."
    >
      <View role="list">
        {people.map((person, index) => (
          <View key={person.email} role="listitem">
            {index === 0 ? null : <Divider isFaint />}
            <View
              style={{ flexDirection: 'row', alignItems: 'center', gap: SPACE.x3, paddingVertical: SPACE.x2 }}
            >
              <View style={{ flexGrow: 1, flexShrink: 1, minWidth: 0, gap: 2 }}>
                <Body weight="medium">{inSentenceCase(person.role)}</Body>
                <Small>{person.name}</Small>
                <Figure value={person.email} size="label" tone="second" />
                <Figure value={person.password} size="label" tone="second" />
              </View>
              <Button
                label="Fill in"
                onPress={() => onChoose(person)}
                accessibleLabel={`Fill in the ${person.role}`}
              />
            </View>
          </View>
        ))}
      </View>
    </Sheet>
  );
}

function inSentenceCase(words: string): string {
  return words.charAt(0).toUpperCase() + words.slice(1);
}
