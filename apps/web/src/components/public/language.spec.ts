import { inLanguage, languageOf } from './language';

it.each([
  ['/d/mill-flats', 'es', '/d/mill-flats?lang=es'],
  ['/d/mill-flats?lang=es', 'en', '/d/mill-flats'],
  ['/subscribe?district=mill-flats', 'es', '/subscribe?district=mill-flats&lang=es'],
  ['/', 'en', '/'],
] as const)('%s in %s is %s', (path, lang, expected) => {
  expect(inLanguage(path, lang)).toBe(expected);
});

it.each([
  ['lang=es', 'es'],
  ['lang=en', 'en'],
  ['lang=xx', 'en'],
  ['', 'en'],
])('a query "%s" asks for %s', (query, expected) => {
  expect(languageOf(new URLSearchParams(query))).toBe(expected);
});
