import { chakra } from '@chakra-ui/react';
import type { ReactNode } from 'react';

const Frame = chakra('div', {
  base: { borderRadius: 'l2', borderWidth: '1px', px: '3.5', py: '2.5', '& p': { margin: 0 } },
  variants: {
    tone: {
      info: { bg: 'air-soft', borderColor: 'air' },
      done: { bg: 'none-soft', borderColor: 'none' },
      warn: { bg: 'lid-soft', borderColor: 'lid' },
      wrong: { bg: 'ban-soft', borderColor: 'ban' },
    },
  },
  defaultVariants: { tone: 'info' },
});

interface MessageProps {
  tone?: 'info' | 'done' | 'warn' | 'wrong';
  title?: string;
  children?: ReactNode;
}

/** Something the reader has to know here and now. What went wrong is announced at once, the rest when there is time. */
export function Message({ tone = 'info', title, children }: MessageProps) {
  return (
    <Frame tone={tone} role={tone === 'wrong' ? 'alert' : 'status'}>
      {title && <strong>{title}</strong>}
      {children && <div>{children}</div>}
    </Frame>
  );
}
