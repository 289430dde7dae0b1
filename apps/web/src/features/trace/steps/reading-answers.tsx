import type { Feed, Seen } from '@lampwright/trace';
import { AnswerButton } from '../controls/answer-button';
import { useTraceWords } from '../words/use-trace-words';

interface ReadingAnswersProps {
  feed: Feed;
  /** What each answer would mean, where that is known. */
  about?: { overload?: string; holds?: string };
  onAnswer: (seen: Seen) => void;
  /** Offers "holds, but lamps stay dark" too. */
  onDark?: () => void;
}

/** The answers to a power-up: overload and holds, then the one that is neither. */
export function ReadingAnswers({ feed, about = {}, onAnswer, onDark }: ReadingAnswersProps) {
  const t = useTraceWords();
  // Through a series lamp, and with a meter, the trailer's lamps stay dark whatever is wrong.
  const lampsLight = feed.kind !== 'seriesLamp' && feed.kind !== 'ohmmeter';
  return (
    <>
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
      <AnswerButton tone="plain" label={t('answer.flickers')} onTap={() => onAnswer('flickers')} />
      {onDark && lampsLight && (
        <AnswerButton
          tone="plain"
          label={t('answer.dark')}
          about={t('answer.darkAbout')}
          onTap={onDark}
        />
      )}
    </>
  );
}
