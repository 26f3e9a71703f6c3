import { Input as ChakraInput, NativeSelect, Textarea as ChakraTextarea } from '@chakra-ui/react';
import type { ComponentProps, ReactNode } from 'react';

const CONTROL = { bg: 'card', borderColor: 'edge', fontSize: 'md' } as const;

/** A one-line control with an edge that can be seen (3:1) and type no phone zooms into (16 px). */
export function Input(props: ComponentProps<typeof ChakraInput>) {
  return <ChakraInput {...CONTROL} {...props} />;
}

/** A control for sentences. */
export function Textarea(props: ComponentProps<typeof ChakraTextarea>) {
  return <ChakraTextarea {...CONTROL} rows={3} {...props} />;
}

interface SelectProps extends ComponentProps<typeof NativeSelect.Field> {
  children: ReactNode;
}

/** A choice from a short list, the platform's own control: good on phones and with keyboards. */
export function Select({ children, ...field }: SelectProps) {
  return (
    <NativeSelect.Root>
      <NativeSelect.Field {...CONTROL} {...field}>
        {children}
      </NativeSelect.Field>
      <NativeSelect.Indicator />
    </NativeSelect.Root>
  );
}
