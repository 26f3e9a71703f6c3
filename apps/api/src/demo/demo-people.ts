import { draw, pick } from './draw';
import type { DemoList } from './demo-scenario';
import type { ListedPerson } from '../subscribers/list-import.service';

/** Numbers kept for fiction in each area code: 555-0101 to 555-0199 (0100 is the office’s own). */
const FICTIONAL_NUMBERS = 99;

/** The one of several named shares into which a draw falls. */
function byShare(shares: Readonly<Record<string, number>>, drawn: number): string {
  let left = drawn;
  for (const [name, share] of Object.entries(shares)) {
    if (left < share) return name;
    left -= share;
  }
  return Object.keys(shares)[0] ?? '';
}

function phoneOf(list: DemoList, nth: number): string {
  const area = list.areaCodes[Math.floor(nth / FICTIONAL_NUMBERS)];
  if (area === undefined)
    throw new Error('The demo has more telephones than fictional numbers. Add area codes.');
  return `+1${area}5550${101 + (nth % FICTIONAL_NUMBERS)}`;
}

function wishesOf(list: DemoList, i: number): Pick<ListedPerson, 'districtSlugs' | 'kinds'> {
  const home = byShare(list.districtShares, draw('district', i));
  const others = Object.keys(list.districtShares).filter((slug) => slug !== home);
  const second = draw('second', i) < list.shares.alsoSecondDistrict ? [pick(others, 'which', i)] : [];
  const kinds: ListedPerson['kinds'] =
    draw('kinds', i) < list.shares.burnBanOnly ? ['burnBan'] : ['advisory', 'burnBan'];
  return { districtSlugs: [home, ...second], kinds };
}

/**
 * The demo's invented residents: the same list at every first start, in an order in which the first sixty are as
 * mixed as the whole.
 */
export function demoPeople(list: DemoList): ListedPerson[] {
  const { textOnly, both, mailOnly, spanish } = list.shares;
  let phones = 0;
  return Array.from({ length: list.people }, (_, i) => {
    const way = byShare({ textOnly, both, mailOnly }, draw('way', i));
    const [first, last] = [pick(list.firstNames, 'first', i), pick(list.lastNames, 'last', i)];
    return {
      lang: draw('lang', i) < spanish ? 'es' : 'en',
      ...(way !== 'textOnly' && { email: `${first}.${last}${i}@${pick(list.mailDomains, 'domain', i)}` }),
      ...(way !== 'mailOnly' && { phone: phoneOf(list, phones++) }),
      ...wishesOf(list, i),
    };
  });
}

/** The addresses of the list whose mailboxes are no more. */
export function bouncingMail(list: DemoList, people: readonly ListedPerson[]): string[] {
  return people.flatMap(({ email }) =>
    email && draw('bounce', email) < list.shares.bouncingMail ? [email] : [],
  );
}
