import { TextArea } from '../../../../ui';
import { FieldButton } from '../../controls/field-button';
import { Ask, Pairs } from '../../controls/panel';
import { useTraceWords } from '../../words/use-trace-words';

interface ChoiceOrWordsProps<Id extends string> {
  title: string;
  choices: readonly Id[];
  labelOf: (id: Id) => string;
  chosen: string | null;
  words: string;
  onChoose: (id: string) => void;
  onWords: (words: string) => void;
}

/** One of a short list, or own words. */
export function ChoiceOrWords<Id extends string>(props: ChoiceOrWordsProps<Id>) {
  const { title, choices, labelOf, chosen, words, onChoose, onWords } = props;
  const t = useTraceWords();
  return (
    <div role="group" aria-label={title}>
      <Ask>{title}</Ask>
      <Pairs marginTop="2">
        {choices.map((id) => (
          <FieldButton key={id} pressed={chosen === id} onTap={() => onChoose(id)}>
            {labelOf(id)}
          </FieldButton>
        ))}
        <FieldButton pressed={chosen === 'other'} onTap={() => onChoose('other')}>
          {t('repair.other')}
        </FieldButton>
      </Pairs>
      {chosen === 'other' && (
        <TextArea
          size="field"
          label={`${title}: ${t('repair.otherWords')}`}
          value={words}
          onChange={(event) => onWords(event.target.value)}
        />
      )}
    </div>
  );
}
