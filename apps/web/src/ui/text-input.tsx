import { chakra, type HTMLChakraProps } from '@chakra-ui/react';
import { controlRecipe } from './control-recipe';
import { Field, type FieldProps } from './field';

const Input = chakra('input', controlRecipe);
const Area = chakra('textarea', controlRecipe);

type Wrapped = Omit<FieldProps, 'children'>;

export interface TextInputProps extends Omit<HTMLChakraProps<'input'>, 'size'>, Wrapped {
  size?: 'office' | 'field';
}

/** One line of text, with its label. Takes what react-hook-form's `register` gives. */
export function TextInput({ label, hint, error, optional, size, ...rest }: TextInputProps) {
  return (
    <Field label={label} hint={hint} error={error} {...(optional ? { optional } : {})}>
      {(aria) => <Input size={size} autoComplete="off" {...aria} {...rest} />}
    </Field>
  );
}

export interface TextAreaProps extends Omit<HTMLChakraProps<'textarea'>, 'size'>, Wrapped {
  size?: 'office' | 'field';
}

/** Several lines of text, with their label. */
export function TextArea({ label, hint, error, optional, size, ...rest }: TextAreaProps) {
  return (
    <Field label={label} hint={hint} error={error} {...(optional ? { optional } : {})}>
      {(aria) => <Area size={size} rows={3} {...aria} {...rest} />}
    </Field>
  );
}
