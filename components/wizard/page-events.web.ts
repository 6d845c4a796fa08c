import type { PageEvents } from './page-events';

/** Watches the page being left (`visibilitychange` is the last event that phones are sure to send) and the connection coming back. */
export function watchPage({ onLeave, onOnline }: PageEvents): () => void {
  const hidden = () => { if (document.visibilityState === 'hidden') onLeave(); };
  document.addEventListener('visibilitychange', hidden);
  window.addEventListener('online', onOnline);
  return () => {
    document.removeEventListener('visibilitychange', hidden);
    window.removeEventListener('online', onOnline);
  };
}
