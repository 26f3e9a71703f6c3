import { useFormContext } from 'react-hook-form';
import { LANGUAGE_NAMES, type Language } from '../../../components/public/language';
import type { PublicDistrictName } from '../../../lib/api/use-public-districts';
import type { Wishes } from '../subscription';
import { SUBSCRIPTION_WORDS } from '../words';
import { CheckGroup } from './check-group';

/** Districts, kinds and language: what a subscriber chooses at first and may change later. */
export function WishesFields({
  districts,
  lang,
}: {
  districts: readonly PublicDistrictName[];
  lang: Language;
}) {
  const words = SUBSCRIPTION_WORDS[lang];
  const { register, formState } = useFormContext<Wishes>();
  const { errors } = formState;
  const some = (text: string) => ({ validate: (chosen: string[]) => chosen.length > 0 || text });
  return (
    <>
      <CheckGroup
        legend={words.districts}
        choices={districts.map(({ slug, name }) => ({ value: slug, label: name }))}
        field={register('districtSlugs', some(words.districtNeeded))}
        error={errors.districtSlugs?.message}
      />
      <CheckGroup
        legend={words.kinds}
        choices={[
          { value: 'burnBan', label: words.kind.burnBan },
          { value: 'advisory', label: words.kind.advisory },
        ]}
        field={register('kinds', some(words.kindNeeded))}
        error={errors.kinds?.message}
      />
      <CheckGroup
        type="radio"
        legend={words.language}
        choices={(['en', 'es'] as const).map((each) => ({
          value: each,
          label: <span lang={each}>{LANGUAGE_NAMES[each]}</span>,
        }))}
        field={register('lang')}
      />
    </>
  );
}
