import type { BreakerType, Feed, FeedKind } from '@lampwright/trace';
import { ChoiceCard } from '../controls/choice-card';
import { Ask, Stack } from '../controls/panel';
import { useTraceWords } from '../words/use-trace-words';

/** The gentlest first: what limits the current, what reports, then what trips or blows. */
const kinds: readonly FeedKind[] = ['seriesLamp', 'tester', 'breaker', 'fuse', 'ohmmeter'];
const breakerTypes: readonly BreakerType[] = [1, 2, 3];

export interface FeedDraft {
  feedKind: FeedKind | null;
  breakerType: BreakerType | null;
  atHand: boolean | null;
}

interface FeedChoiceProps {
  draft: FeedDraft;
  change: (part: Partial<FeedDraft>) => void;
  /** The feeds to choose from; all of them by default. */
  offered?: readonly FeedKind[];
}

/** What feeds power, how its breaker behaves, and whether the switch is at hand. */
export function FeedChoice({ draft, change, offered = kinds }: FeedChoiceProps) {
  const t = useTraceWords();
  return (
    <>
      <Stack>
        {offered.map((kind) => (
          <ChoiceCard
            single
            key={kind}
            label={t(`feed.${kind}.name`)}
            about={t(`feed.${kind}.about`)}
            {...(kind === 'seriesLamp' ? { badge: t('intake.recommended') } : {})}
            chosen={draft.feedKind === kind}
            onTap={() => change({ feedKind: kind })}
          />
        ))}
      </Stack>
      {draft.feedKind === 'breaker' && (
        <>
          <Ask>{t('breakerType.ask')}</Ask>
          <Stack>
            {breakerTypes.map((type) => (
              <ChoiceCard
                single
                key={type}
                label={t(`breakerType.type${type}`)}
                about={t(`breakerType.type${type}about`)}
                chosen={draft.breakerType === type}
                onTap={() => change({ breakerType: type })}
              />
            ))}
          </Stack>
        </>
      )}
      <Ask>{t('intake.atHand')}</Ask>
      <Stack>
        <ChoiceCard
          single
          label={t('intake.atHandYes')}
          about={t('intake.atHandYesAbout')}
          chosen={draft.atHand === true}
          onTap={() => change({ atHand: true })}
        />
        <ChoiceCard
          single
          label={t('intake.atHandNo')}
          chosen={draft.atHand === false}
          onTap={() => change({ atHand: false })}
        />
      </Stack>
    </>
  );
}

/** The feed, once all that it needs is said. */
export function feedOf({ feedKind, breakerType, atHand }: FeedDraft): Feed | null {
  if (feedKind === null || atHand === null) return null;
  if (feedKind !== 'breaker') return { kind: feedKind, atHand };
  return breakerType === null ? null : { kind: feedKind, breakerType, atHand };
}
