import { useEffect, useState } from 'react';
import type { Preview, Question } from './types';

/** What previews have asked so far: an answered question is not asked again, but stays so that it can be changed. */
export function useAsked(preview: Preview | undefined): readonly Question[] {
  const [asked, setAsked] = useState<readonly Question[]>([]);
  useEffect(() => {
    const fresh = preview?.questions ?? [];
    if (fresh.length === 0) return;
    setAsked((before) => [...before.filter(({ id }) => fresh.every((each) => each.id !== id)), ...fresh]);
  }, [preview]);
  return asked;
}
