import { chakra } from '@chakra-ui/react';
import { readHarnessText, type Harness, type HarnessFault } from '@lampwright/harness';
import { useTranslation } from 'react-i18next';
import { controlRecipe } from '../../ui/control-recipe';
import { Field } from '../../ui';

export type FileReading =
  | { kind: 'plan'; name: string; harness: Harness }
  | { kind: 'faults'; faults: HarnessFault[]; more: boolean }
  | { kind: 'unreadable' };

const FileInput = chakra('input', controlRecipe);

async function read(file: File): Promise<FileReading> {
  let text: string;
  try {
    text = await file.text();
  } catch (error) {
    // The file was moved or changed after it was picked.
    if (error instanceof DOMException) return { kind: 'unreadable' };
    throw error;
  }
  const reading = readHarnessText(text);
  if (!reading.ok) return { kind: 'faults', faults: reading.faults, more: reading.more };
  return { kind: 'plan', name: `${file.name}:${file.lastModified}`, harness: reading.harness };
}

/** Picks a plan file and reads it here, before anything is sent. */
export function PlanFile({ onRead }: { onRead: (reading: FileReading) => void }) {
  const { t } = useTranslation('plans');
  return (
    <Field label={t('file')} hint={t('fileHint')}>
      {(aria) => (
        <FileInput
          type="file"
          accept=".json,application/json"
          maxW="34rem"
          {...aria}
          onChange={(event) => {
            const file = event.target.files?.[0];
            if (file) void read(file).then(onRead);
          }}
        />
      )}
    </Field>
  );
}
