import { Text } from 'react-native';
import { FONTS, SIZES, TITLE_LINE_HEIGHT, useTheme } from '../../../ui';
import type { SentencePart } from '../answer-words';

/** The answer in one sentence, before any chart; the cause in the hue of its gas. */
export function AnswerSentence({ parts }: { parts: SentencePart[] }) {
  const { colors } = useTheme();
  return (
    <Text
      role="heading"
      aria-level={2}
      style={{
        fontFamily: FONTS.semibold,
        fontSize: SIZES.title,
        lineHeight: Math.round(SIZES.title * TITLE_LINE_HEIGHT),
        color: colors.ink,
      }}
    >
      {parts.map((part, index) => (
        <Text
          key={index}
          style={
            part.gas === undefined
              ? undefined
              : { color: part.gas === 'oxygen' ? colors.oxygen : colors.water }
          }
        >
          {part.text}
        </Text>
      ))}
    </Text>
  );
}
