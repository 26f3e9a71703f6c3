import { Stack } from '@chakra-ui/react';
import type { ReactNode } from 'react';
import { FormProvider, type FieldValues } from 'react-hook-form';
import type { EntryForm as Entries } from '../../lib/use-entry-form';
import { Button } from '../ui/button';
import { Message } from '../ui/message';

interface EntryFormProps<T extends FieldValues> {
  entries: Entries<T>;
  /** What the button does: "Add the tower". */
  act: string;
  children: ReactNode;
}

/** The frame of a form: its fields, what the service refused, and its one button. */
export function EntryForm<T extends FieldValues>({ entries, act, children }: EntryFormProps<T>) {
  const { form, send, busy, refusal } = entries;
  const submit = (event: React.FormEvent) => {
    event.preventDefault();
    void send();
  };
  return (
    <FormProvider {...form}>
      <form onSubmit={submit} noValidate>
        <Stack gap="4">
          {children}
          {refusal && <Message tone="wrong">{refusal}</Message>}
          <Button type="submit" kind="go" busy={busy} alignSelf="flex-start">
            {act}
          </Button>
        </Stack>
      </form>
    </FormProvider>
  );
}
