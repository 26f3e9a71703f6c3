import { useState } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import type { Language } from '../../../components/public/language';
import { PublicMessage } from '../../../components/public/public-message';
import type { PublicDistrictName } from '../../../lib/api/use-public-districts';
import { asProblem } from '../../../lib/api/problem';
import { showFieldProblems } from '../../../lib/show-field-problems';
import { looksLikeEmail, looksLikePhone } from '../address-shapes';
import { subscribe } from '../api';
import type { SubscriptionRequest, Wishes } from '../subscription';
import { SUBSCRIPTION_WORDS } from '../words';
import { TextField } from './text-field';
import { WishesFields } from './wishes-fields';

/** What stands in the form. */
export interface SubscribeEntries extends Wishes {
  email: string;
  phone: string;
}

interface SubscribeFormProps {
  districts: readonly PublicDistrictName[];
  lang: Language;
  /** What stood in the form before, or what a link chose. */
  entries: SubscribeEntries;
  onSent: (entries: SubscribeEntries) => void;
}

/** Asks where to write, for which districts, of what, in which language. An address that stays empty is left out. */
export function SubscribeForm({ districts, lang, entries, onSent }: SubscribeFormProps) {
  const words = SUBSCRIPTION_WORDS[lang];
  const form = useForm<SubscribeEntries>({ defaultValues: entries });
  const { register, handleSubmit, formState, getValues, setError } = form;
  const [refusal, setRefusal] = useState<string>();
  const oneNeeded = () => Boolean(getValues('email').trim() || getValues('phone').trim()) || words.oneNeeded;

  const send = handleSubmit(async (typed) => {
    setRefusal(undefined);
    try {
      await subscribe(toRequest(typed));
      onSent(typed);
    } catch (error) {
      const fields = ['email', 'phone', 'districtSlugs', 'kinds'] as const;
      setRefusal(showFieldProblems<SubscribeEntries>(asProblem(error), fields, setError));
    }
  });

  return (
    <FormProvider {...form}>
      <form onSubmit={(event) => void send(event)} noValidate>
        <p className="help">{words.oneOfBoth}</p>
        <TextField
          label={words.email}
          type="email"
          autoComplete="email"
          error={formState.errors.email?.message}
          field={register('email', {
            validate: {
              oneNeeded,
              shape: (text) => !text.trim() || looksLikeEmail(text) || words.emailWrong,
            },
          })}
        />
        <TextField
          label={words.phone}
          help={words.phoneHelp}
          type="tel"
          autoComplete="tel"
          error={formState.errors.phone?.message}
          field={register('phone', {
            validate: (text) => !text.trim() || looksLikePhone(text) || words.phoneWrong,
          })}
        />
        <WishesFields districts={districts} lang={lang} />
        <p className="help">{words.consent}</p>
        {refusal && <PublicMessage wrong>{refusal}</PublicMessage>}
        <button className="button-go button-wide" disabled={formState.isSubmitting}>
          {words.send}
        </button>
      </form>
    </FormProvider>
  );
}

function toRequest({ email, phone, ...wishes }: SubscribeEntries): SubscriptionRequest {
  return {
    ...wishes,
    ...(email.trim() && { email: email.trim() }),
    ...(phone.trim() && { phone: phone.trim() }),
  };
}
