import { Box, chakra, Stack } from '@chakra-ui/react';
import { useId } from 'react';
import type { Question } from '../types';

const Line = chakra('label', { base: { display: 'flex', gap: '2', alignItems: 'baseline', py: '1' } });
const Dot = chakra('input', {
  base: { width: '18px', height: '18px', accentColor: 'air', margin: 0, flex: 'none' },
});

interface QuestionChoiceProps {
  question: Question;
  /** The answer given; undefined: none yet. */
  value: string | undefined;
  onAnswer: (value: string) => void;
}

/** Something only a person can say of the file, with the lines it is about. */
export function QuestionChoice({ question, value, onAnswer }: QuestionChoiceProps) {
  const name = useId();
  return (
    <chakra.fieldset border="0" p="0" m="0">
      <chakra.legend fontWeight="600" p="0">
        {question.text}
      </chakra.legend>
      {question.examples.length > 0 && (
        <Box color="mute" fontSize="sm" fontFamily="mono" overflowWrap="anywhere">
          {question.examples.join(' · ')}
        </Box>
      )}
      <Stack gap="0" mt="1">
        {question.choices.map((choice) => (
          <Line key={choice.value}>
            <Dot
              type="radio"
              name={name}
              checked={value === choice.value}
              onChange={() => onAnswer(choice.value)}
            />
            {choice.text}
          </Line>
        ))}
      </Stack>
    </chakra.fieldset>
  );
}
