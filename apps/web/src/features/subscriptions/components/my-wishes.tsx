import { useState } from 'react';
import { FormProvider, useForm } from 'react-hook-form';
import type { Language } from '../../../components/public/language';
import { PublicMessage } from '../../../components/public/public-message';
import { asProblem } from '../../../lib/api/problem';
import type { PublicDistrictName } from '../../../lib/api/use-public-districts';
import { showFieldProblems } from '../../../lib/show-field-problems';
import { changeWishes } from '../api';
import type { SubscriptionView, Wishes } from '../subscription';
import { SUBSCRIPTION_WORDS } from '../words';
import { WishesFields } from './wishes-fields';

interface MyWishesProps {
  token: string;
  lang: Language;
  view: SubscriptionView;
  districts: readonly PublicDistrictName[];
}

/** A subscriber's wishes, to be changed. */
export function MyWishes({ token, lang, view, districts }: MyWishesProps) {
  const words = SUBSCRIPTION_WORDS[lang];
  const { lang: noticeLang, districtSlugs, kinds } = view;
  const form = useForm<Wishes>({ defaultValues: { lang: noticeLang, districtSlugs, kinds } });
  const [outcome, setOutcome] = useState<{ wrong: boolean; text: string }>();

  const save = form.handleSubmit(async (wishes) => {
    setOutcome(undefined);
    try {
      await changeWishes(token, wishes);
      setOutcome({ wrong: false, text: words.saved });
    } catch (error) {
      const text = showFieldProblems<Wishes>(asProblem(error), ['districtSlugs', 'kinds'], form.setError);
      if (text) setOutcome({ wrong: true, text });
    }
  });

  return (
    <FormProvider {...form}>
      <form onSubmit={(event) => void save(event)} noValidate>
        <WishesFields districts={districts} lang={lang} />
        {outcome && <PublicMessage wrong={outcome.wrong}>{outcome.text}</PublicMessage>}
        <button className="button-go button-wide" disabled={form.formState.isSubmitting}>
          {words.save}
        </button>
      </form>
    </FormProvider>
  );
}
