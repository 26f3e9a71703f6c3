import { Flex } from '@chakra-ui/react';
import { counted, count } from '../../lib/format/number';
import { Button } from './button';

interface PagerProps {
  page: number;
  pageSize: number;
  total: number;
  /** One of them: "notice". */
  what: string;
  onPage: (page: number) => void;
}

/** Which part of a list is shown, and the way to the others. */
export function Pager({ page, pageSize, total, what, onPage }: PagerProps) {
  const last = Math.max(1, Math.ceil(total / pageSize));
  if (last === 1)
    return (
      <Flex color="mute" fontSize="sm">
        {counted(total, what)}
      </Flex>
    );
  const first = (page - 1) * pageSize + 1;
  return (
    <Flex as="nav" aria-label="Pages" gap="3" align="center" wrap="wrap" data-screen-only>
      <Button size="sm" disabled={page <= 1} onClick={() => onPage(page - 1)}>
        Back
      </Button>
      <span>
        {count(first)} to {count(Math.min(total, page * pageSize))} of {counted(total, what)}
      </span>
      <Button size="sm" disabled={page >= last} onClick={() => onPage(page + 1)}>
        Next
      </Button>
    </Flex>
  );
}
