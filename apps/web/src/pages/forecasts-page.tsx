import { useSearchParams } from 'react-router-dom';
import { PageHead } from '../components/layout/page-head';
import { Empty } from '../components/states/empty';
import { Loaded } from '../components/states/loaded';
import { ForecastsView } from '../features/forecasts/components/forecasts-view';
import { useDistricts } from '../lib/api/use-districts';
import { useMe } from '../lib/api/use-me';

/** The forecasts of a district's nights and days, and what they turned out to be. */
export function ForecastsPage() {
  const districts = useDistricts();
  const { me } = useMe();
  const [search, setSearch] = useSearchParams();
  return (
    <>
      <PageHead title="Forecasts" />
      <Loaded from={districts} what="the districts">
        {(all) => {
          const district = all.find(({ slug }) => slug === search.get('district')) ?? all[0];
          if (!district)
            return <Empty title="There is no district yet">An administrator adds the first.</Empty>;
          return (
            <ForecastsView
              key={district.id}
              {...{ districts: all, district }}
              canWrite={me?.role === 'analyst'}
              onDistrict={(slug) => setSearch({ district: slug }, { replace: true })}
            />
          );
        }}
      </Loaded>
    </>
  );
}
