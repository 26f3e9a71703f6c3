import { Box } from '@chakra-ui/react';
import { useState, type ReactNode } from 'react';
import { Button } from './button';
import { Message } from './message';

interface ShownOnceProps {
  title: string;
  /** The secret itself: a key, a link. */
  secret: string;
  children?: ReactNode;
}

/** A secret that is shown this one time, with a button to copy it. */
export function ShownOnce({ title, secret, children }: ShownOnceProps) {
  const [copied, setCopied] = useState(false);
  const copy = () => navigator.clipboard.writeText(secret).then(() => setCopied(true));
  return (
    <Message tone="done" title={title}>
      <Box as="code" display="block" my="2" p="2" bg="card" overflowWrap="anywhere" fontSize="sm">
        {secret}
      </Box>
      {'clipboard' in navigator && (
        <Button size="sm" onClick={() => void copy()}>
          {copied ? 'Copied' : 'Copy'}
        </Button>
      )}
      {children}
    </Message>
  );
}
