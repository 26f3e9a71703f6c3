import { useDistricts } from './api/use-districts';

/** The zone of the first district in which a tower has a part, UTC where it has none; undefined until it is known. */
export function useTowerZone(towerId: number): string | undefined {
  const { data } = useDistricts();
  if (!data) return undefined;
  const own = data.find(
    ({ towers, floorTowerId, benchTowerId, pm25TowerId }) =>
      towers.some((each) => each.towerId === towerId) ||
      [floorTowerId, benchTowerId, pm25TowerId].includes(towerId),
  );
  return own?.timeZone ?? 'UTC';
}
