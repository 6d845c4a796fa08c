import { useEffect } from 'react';

// The page that the browser itself opened keeps its own focus; only moves inside of the product set it.
let opened = false;

/** Puts the focus on the page's h1 whenever `key` changes, so that a screen reader says where one has come and Tab starts there. */
export function useFocusHeading(key: string): void {
  useEffect(() => {
    if (!opened) {
      opened = true;
      return;
    }
    const heading = document.querySelector('h1');
    if (!heading) return;
    heading.tabIndex = -1;
    heading.focus({ preventScroll: true });
    window.scrollTo(0, 0);
  }, [key]);
}
