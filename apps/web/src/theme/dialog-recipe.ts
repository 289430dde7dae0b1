import { defineSlotRecipe } from '@chakra-ui/react';

export const dialogSlotRecipe = defineSlotRecipe({
  slots: ['backdrop', 'positioner', 'content', 'title', 'description', 'body', 'footer'],
  base: {
    backdrop: { pos: 'fixed', inset: '0', bg: 'rgb(13 22 29 / 0.6)', zIndex: 'popover' },
    positioner: {
      pos: 'fixed',
      inset: '0',
      zIndex: 'popover',
      display: 'flex',
      alignItems: { base: 'flex-end', md: 'center' },
      justifyContent: 'center',
      p: { base: '3', md: '6' },
      overflow: 'auto',
    },
    content: {
      w: 'full',
      maxW: '34rem',
      maxH: '100%',
      overflow: 'auto',
      bg: 'bg.panel',
      color: 'fg',
      borderWidth: '1.5px',
      borderColor: 'edge',
      borderRadius: 'lg',
      p: '6',
      display: 'flex',
      flexDirection: 'column',
      gap: '4',
    },
    title: { fontSize: 'xl', fontWeight: 'bold', lineHeight: '1.2' },
    description: { color: 'fg.muted' },
    body: { display: 'flex', flexDirection: 'column', gap: '4' },
    footer: {
      display: 'flex',
      flexWrap: 'wrap-reverse',
      justifyContent: 'flex-end',
      gap: 'touch',
      pt: '2',
    },
  },
});
