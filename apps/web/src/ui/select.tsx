import { chakra, type HTMLChakraProps } from '@chakra-ui/react';
import { ChevronDown } from 'lucide-react';
import { controlRecipe } from './control-recipe';
import { Field, type FieldProps } from './field';

const Native = chakra('select', controlRecipe);
const Holder = chakra('div', {
  base: {
    position: 'relative',
    '& select': { appearance: 'none', pr: '11', textOverflow: 'ellipsis' },
    '& svg': {
      position: 'absolute',
      right: '14px',
      top: 'calc(50% - 10px)',
      pointerEvents: 'none',
    },
  },
});

export interface SelectProps
  extends Omit<HTMLChakraProps<'select'>, 'size'>, Omit<FieldProps, 'children'> {
  size?: 'office' | 'field';
  options: readonly { value: string; label: string }[];
}

/** The device's own picker, with a label: it works with gloves, keyboards and readers as people know it. */
export function Select({ label, hint, error, optional, size, options, ...rest }: SelectProps) {
  return (
    <Field label={label} hint={hint} error={error} {...(optional ? { optional } : {})}>
      {(aria) => (
        <Holder>
          <Native size={size} {...aria} {...rest}>
            {options.map((option) => (
              <option key={option.value} value={option.value}>
                {option.label}
              </option>
            ))}
          </Native>
          <ChevronDown size={20} aria-hidden />
        </Holder>
      )}
    </Field>
  );
}
