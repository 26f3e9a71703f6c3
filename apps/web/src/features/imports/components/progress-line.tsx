import { Progress } from '@chakra-ui/react';

/** How far something under way is; `share` 0 to 1. */
export function ProgressLine({ label, share }: { label: string; share: number }) {
  const percent = Math.min(100, Math.round(share * 100));
  return (
    <Progress.Root value={percent} width="100%" textAlign="start" aria-live="polite">
      <Progress.Label fontWeight="600" display="flex" justifyContent="space-between" mb="1">
        <span>{label}</span>
        <span>{percent} %</span>
      </Progress.Label>
      <Progress.Track bg="line" borderRadius="full">
        <Progress.Range bg="air" />
      </Progress.Track>
    </Progress.Root>
  );
}
