import { chakra } from '@chakra-ui/react';

/** A sheet on the paper: one matter each. `edge` marks what needs a person. */
export const Card = chakra('section', {
  base: { bg: 'card', borderWidth: '1px', borderColor: 'line', borderRadius: 'l3' },
  variants: {
    edge: {
      lid: { borderInlineStartWidth: '5px', borderInlineStartColor: 'lid' },
      ban: { borderInlineStartWidth: '5px', borderInlineStartColor: 'ban' },
      air: { borderInlineStartWidth: '5px', borderInlineStartColor: 'air' },
    },
    padded: { true: { px: { base: '3.5', md: '4' }, py: '3.5' } },
  },
});
