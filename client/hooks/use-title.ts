import { useEffect } from 'react';

/** Sets the document's title to `<title> · Featherbeam`. */
export function useTitle(title: string): void {
  useEffect(() => {
    document.title = title === '' ? 'Featherbeam' : `${title} · Featherbeam`;
  }, [title]);
}
