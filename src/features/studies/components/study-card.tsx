import { View } from 'react-native';
import type { Study } from '../../../../shared/contract/studies';
import { MiniRuler } from '../../../charts';
import { Body, Figure, HAIRLINE_PX, Inline, SPACE, Small, useAnchorClick, useTheme } from '../../../ui';
import { LIMIT_WORDS, shortAnswer } from '../answer-words';

export interface StudyCardProps {
  study: Study;
  href: string;
  isCurrent: boolean;
}

/** A study with its answer on it: best wall, days against the target, what ends the life. */
export function StudyCard({ study, href, isCurrent }: StudyCardProps) {
  const { colors } = useTheme();
  const onClick = useAnchorClick(href);
  return (
    <View
      href={href}
      onClick={onClick}
      aria-current={isCurrent ? 'page' : undefined}
      style={{
        gap: SPACE.x1,
        paddingVertical: SPACE.x3,
        paddingHorizontal: SPACE.x4,
        backgroundColor: colors.sheet,
        borderWidth: HAIRLINE_PX,
        borderColor: colors.line,
        borderLeftWidth: isCurrent ? 3 : HAIRLINE_PX,
        borderLeftColor: isCurrent ? colors.ink : colors.line,
      }}
    >
      <Body weight="semibold">{study.revision.spec.name}</Body>
      <CardAnswer study={study} />
      <Small tone="third">{`${study.food_name} · ${study.pack_name} · ${study.route_name}`}</Small>
    </View>
  );
}

function CardAnswer({ study }: { study: Study }) {
  const { headline } = study;
  if (headline === null) return <Small>No answer yet: open it and run it.</Small>;
  const targetDays = study.revision.spec.target_days;
  const cause = headline.first_limit === null ? null : LIMIT_WORDS[headline.first_limit];
  return (
    <>
      <Inline justify="space-between" gap="x3">
        <Figure
          value={shortAnswer(headline.shelf_life_days, { targetDays, horizonDays: headline.horizon_days })}
          isStrong
        />
        <MiniRuler days={headline.shelf_life_days} targetDays={targetDays} gas={cause?.gas ?? null} />
      </Inline>
      <Small>
        {study.laminate_names.length > 1 ? 'best: ' : ''}
        {`${headline.best_laminate_name} · `}
        {cause === null ? 'no limit reached' : 'ends by '}
        {cause === null ? null : (
          <Small tone={cause.gas} weight="semibold">
            {cause.cause}
          </Small>
        )}
      </Small>
      {study.is_outdated ? <Small tone="ink">Newer data exist than this answer used.</Small> : null}
    </>
  );
}
