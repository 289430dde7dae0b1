import { useCallback } from 'react';
import type { FieldValues, Path, UseFormReturn } from 'react-hook-form';
import { useTranslation } from 'react-i18next';
import { ApiError } from './api-error';

/**
 * Writes what the server says of single fields beside them. Answers whether every complaint found its field; if not,
 * the form shows the problem as a whole too.
 */
export function useFieldErrors() {
  const { t, i18n } = useTranslation('errors');
  return useCallback(
    <T extends FieldValues>(error: unknown, form: UseFormReturn<T>): boolean => {
      if (!(error instanceof ApiError) || error.fields.length === 0) return false;
      let placed = 0;
      for (const { path, code, message } of error.fields) {
        if (!(path in form.getValues())) continue;
        const key = `errors:field.${code}`;
        // Names of validators that have no words of their own come with the server's sentence.
        const words = i18n.exists(key) ? t(`field.${code}` as 'field.emailTaken') : message;
        form.setError(
          path as Path<T>,
          { type: 'server', message: words },
          { shouldFocus: placed === 0 },
        );
        placed += 1;
      }
      return placed === error.fields.length;
    },
    [i18n, t],
  );
}
