import { useEffect } from 'react';

/** Names the document after the page, so that tabs, history and screen readers tell pages apart. */
export function usePageTitle(title: string, office?: string): void {
  useEffect(() => {
    document.title = office ? `${title} · ${office}` : title;
  }, [title, office]);
}
