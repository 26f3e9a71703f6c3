import { Box, Tabs } from '@chakra-ui/react';
import type { NoticeText } from '../../lib/api/types';
import { TextAsSent } from './text-as-sent';

interface NoticeTextsProps {
  texts: { en: NoticeText; es: NoticeText };
  /** Segments of the text message, where they were counted. */
  segments?: { en: number; es: number };
}

/** The notice word for word, as it goes to people: text message, mail and public page, in both languages. */
export function NoticeTexts({ texts, segments }: NoticeTextsProps) {
  return (
    <Tabs.Root defaultValue="en" lazyMount size="sm">
      <Tabs.List>
        <Tabs.Trigger value="en">English</Tabs.Trigger>
        <Tabs.Trigger value="es">Español</Tabs.Trigger>
      </Tabs.List>
      {(['en', 'es'] as const).map((language) => (
        <Tabs.Content key={language} value={language}>
          <Box lang={language}>
            <TextAsSent text={texts[language]} segments={segments?.[language]} />
          </Box>
        </Tabs.Content>
      ))}
    </Tabs.Root>
  );
}
