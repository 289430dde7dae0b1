import { useCallback, useEffect, useState } from 'react';
import type { DefaultValues, FieldValues, UseFormReturn } from 'react-hook-form';
import { useDraft } from './use-draft';

function isStrings(kept: unknown): kept is Record<string, unknown> {
  return typeof kept === 'object' && kept !== null && !Array.isArray(kept);
}

export interface FormDraft {
  /** True where this form opened with what was typed before. */
  restored: boolean;
  safe: boolean;
  /** Forgets the draft after the server has it. */
  clear: () => void;
}

/**
 * Keeps what is typed into a form under `name` and fills it in again, but never the fields named in `secret`. Only what
 * differs from the form's own values is kept: the rest may be newer on the server by then.
 */
export function useFormDraft<T extends FieldValues>(
  name: string,
  form: UseFormReturn<T>,
  secret: readonly (keyof T & string)[] = [],
): FormDraft {
  const {
    kept,
    ready,
    safe,
    save,
    clear: forget,
  } = useDraft(name, (value) => (isStrings(value) ? value : null));
  const [cleared, setCleared] = useState(false);
  const { reset, watch, getValues } = form;
  const { defaultValues } = form.formState;

  useEffect(() => {
    if (!ready || !kept) return;
    const known = Object.entries(kept).filter(([field]) => field in getValues());
    reset({ ...getValues(), ...Object.fromEntries(known) } as DefaultValues<T>, {
      keepDefaultValues: true,
    });
  }, [ready, kept, reset, getValues]);

  useEffect(() => {
    const watching = watch((values, { type }) => {
      if (type !== 'change') return;
      save(
        Object.fromEntries(
          Object.entries(values).filter(
            ([field, value]) =>
              !secret.includes(field) &&
              JSON.stringify(value) !== JSON.stringify(defaultValues?.[field]),
          ),
        ),
      );
    });
    return () => watching.unsubscribe();
  }, [watch, save, secret, defaultValues]);

  const clear = useCallback(() => {
    forget();
    setCleared(true);
  }, [forget]);
  return { restored: kept !== null && !cleared, safe, clear };
}
