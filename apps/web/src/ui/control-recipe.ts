import { defineRecipe } from '@chakra-ui/react';

/** The box of everything that is typed or picked from. */
export const controlRecipe = defineRecipe({
  className: 'control',
  base: {
    w: 'full',
    minH: 'office',
    px: '3.5',
    py: '2',
    bg: 'bg.panel',
    color: 'fg',
    font: 'inherit',
    border: '1.5px solid',
    borderColor: 'edge',
    borderRadius: 'md',
    '&[aria-invalid]': { borderColor: 'ember.mark', borderWidth: '2px' },
    '&::file-selector-button': {
      font: 'inherit',
      color: 'fg',
      bg: 'bg.sunken',
      border: '1.5px solid',
      borderColor: 'edge',
      borderRadius: 'sm',
      px: '3.5',
      py: '1.5',
      me: '3.5',
      cursor: 'pointer',
    },
    _disabled: { opacity: '0.6', cursor: 'not-allowed' },
  },
  variants: {
    size: {
      office: { minH: 'office', fontSize: 'md' },
      field: { minH: 'field', fontSize: 'lg' },
    },
  },
  defaultVariants: { size: 'field' },
});
