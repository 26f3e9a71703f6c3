import { TZDate } from '@date-fns/tz';
import { getYear } from 'date-fns';

const LETTERS = 3;

/**
 * What a notice's short reference begins with: the district's initials (of one word, its first letters) and the year
 * in its zone: `MF-26-` for Mill Flats. Only letters A to Z, so that it can be said on the telephone.
 */
export function referencePrefix(districtName: string, timeZone: string, epochS: number): string {
  const words = districtName
    .normalize('NFD')
    .replace(/[^A-Za-z ]/g, '')
    .toUpperCase()
    .split(' ')
    .filter(Boolean);
  const letters = words.length > 1 ? words.map((word) => word.charAt(0)).join('') : (words[0] ?? 'N');
  const year = getYear(new TZDate(epochS * 1000, timeZone)) % 100;
  return `${letters.slice(0, LETTERS)}-${String(year).padStart(2, '0')}-`;
}
