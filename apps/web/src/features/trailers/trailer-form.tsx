import { chakra } from '@chakra-ui/react';
import type { TrailerDto, WriteTrailerRequest } from '@lampwright/contracts';
import { useEffect } from 'react';
import { useForm } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { useAccount } from '../../lib/session-context';
import type { Outcome } from '../../lib/use-action';
import { useFieldErrors } from '../../lib/use-field-errors';
import { useFormDraft } from '../../lib/use-form-draft';
import { Button, DraftNote, ErrorState } from '../../ui';
import { TrailerFields } from './trailer-fields';
import { BLANK, toRequest, toValues, type TrailerValues } from './trailer-values';

const Form = chakra('form', { base: { display: 'flex', flexDirection: 'column', gap: '6' } });

export interface TrailerFormProps {
  /** The trailer that is edited; without it a new one is added. */
  trailer?: TrailerDto;
  submitWords: string;
  busy: boolean;
  error: unknown;
  onSubmit: (request: WriteTrailerRequest) => Promise<Outcome<TrailerDto> | null>;
  onDone: (saved: TrailerDto) => void;
}

export function TrailerForm({
  trailer,
  submitWords,
  busy,
  error,
  onSubmit,
  onDone,
}: TrailerFormProps) {
  const { t } = useTranslation(['trailers', 'common']);
  const { lengths } = useAccount().preferences;
  const start = trailer ? toValues(trailer, lengths) : BLANK;
  const form = useForm<TrailerValues>({ defaultValues: start });
  const draft = useFormDraft(`trailer:${trailer?.id ?? 'new'}:${lengths}`, form);
  const placeErrors = useFieldErrors();

  useEffect(() => {
    if (error !== null) placeErrors(error, form);
  }, [error, form, placeErrors]);

  const submit = form.handleSubmit(async (values) => {
    const outcome = await onSubmit(toRequest(values, lengths, trailer));
    if (!outcome?.ok) return;
    draft.clear();
    onDone(outcome.value);
  });
  const afresh = () => {
    form.reset(start);
    draft.clear();
  };

  return (
    <Form noValidate onSubmit={(event) => void submit(event)}>
      <DraftNote draft={draft} onAfresh={afresh} />
      <TrailerFields form={form} unit={lengths} />
      {error !== null && <ErrorState error={error} />}
      <div>
        <Button type="submit" look="primary" busy={busy}>
          {submitWords}
        </Button>{' '}
        <Button look="quiet" onClick={() => window.history.back()}>
          {t('common:cancel')}
        </Button>
      </div>
    </Form>
  );
}
