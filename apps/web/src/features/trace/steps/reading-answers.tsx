import type { Feed, Seen } from '@lampwright/trace';
import type { ReactNode } from 'react';
import { AnswerButton } from '../controls/answer-button';
import { PanelAnswers, PanelMore, TwoAnswers } from '../controls/panel';
import { useTraceWords } from '../words/use-trace-words';

interface ReadingAnswersProps {
  feed: Feed;
  /** The question, right above the answers. */
  ask: ReactNode;
  /** What each answer would mean, where that is known. */
  about?: { overload?: string; holds?: string };
  onAnswer: (seen: Seen) => void;
  /** Offers "holds, but lamps stay dark" too. */
  onDark?: () => void;
  /** What can be said or done instead. */
  children?: ReactNode;
}

/** The answers to a power-up: overload and holds, which on a phone stay at the thumb, then the rest. */
export function ReadingAnswers(props: ReadingAnswersProps) {
  const { feed, ask, about = {}, onAnswer, onDark, children } = props;
  const t = useTraceWords();
  // Through a series lamp, and with a meter, the trailer's lamps stay dark whatever is wrong.
  const lampsLight = feed.kind !== 'seriesLamp' && feed.kind !== 'ohmmeter';
  return (
    <>
      <PanelAnswers>
        {ask}
        <TwoAnswers>
          <AnswerButton
            tone="overload"
            label={t(`feed.${feed.kind}.overload`)}
            {...(about.overload ? { about: about.overload } : {})}
            onTap={() => onAnswer('overload')}
          />
          <AnswerButton
            tone="holds"
            label={t(`feed.${feed.kind}.holds`)}
            {...(about.holds ? { about: about.holds } : {})}
            onTap={() => onAnswer('holds')}
          />
        </TwoAnswers>
      </PanelAnswers>
      <PanelMore>
        <AnswerButton
          tone="plain"
          label={t('answer.flickers')}
          onTap={() => onAnswer('flickers')}
        />
        {onDark && lampsLight && (
          <AnswerButton
            tone="plain"
            label={t('answer.dark')}
            about={t('answer.darkAbout')}
            onTap={onDark}
          />
        )}
        {children}
      </PanelMore>
    </>
  );
}
