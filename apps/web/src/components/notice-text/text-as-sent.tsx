import { Box, chakra, Stack } from '@chakra-ui/react';
import type { NoticeText } from '../../lib/api/types';
import { counted } from '../../lib/format/number';

const Sheet = chakra('div', {
  base: {
    bg: 'paper',
    borderWidth: '1px',
    borderColor: 'line',
    borderRadius: 'l2',
    px: '3.5',
    py: '2.5',
    overflowWrap: 'anywhere',
  },
});
const Label = chakra('div', { base: { color: 'mute', fontSize: 'sm' } });
const Summary = chakra('summary', { base: { cursor: 'pointer', fontWeight: '600', py: '1.5' } });

/** One language of a notice. The text message is read first; mail and page open below it. */
export function TextAsSent({ text, segments }: { text: NoticeText; segments?: number | undefined }) {
  const { public: page } = text;
  return (
    <Stack gap="2">
      <Sheet>
        <Label>
          Text message · {counted(text.sms.length, 'character')}
          {segments !== undefined && `, ${counted(segments, 'segment')}`}
        </Label>
        {text.sms}
      </Sheet>
      <details>
        <Summary>Mail: {text.subject}</Summary>
        <Sheet whiteSpace="pre-wrap">{text.mailText}</Sheet>
      </details>
      <details>
        <Summary>Public page: {page.headline}</Summary>
        <Sheet>
          <strong>{page.headline}</strong> {page.untilText}
          <Box as="ul" ps="5" my="1.5">
            {page.whatToDo.map((line) => (
              <li key={line}>{line}</li>
            ))}
          </Box>
          <p>{page.exemptions}</p>
          <p>{page.why}</p>
          {page.cautions.map((line) => (
            <p key={line}>{line}</p>
          ))}
        </Sheet>
      </details>
    </Stack>
  );
}
