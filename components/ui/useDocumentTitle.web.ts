import { useEffect } from 'react';

/** Names the browser's tab. */
export function useDocumentTitle(title: string): void {
  useEffect(() => {
    document.title = title;
  }, [title]);
}
