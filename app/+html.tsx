import type { ReactNode } from 'react';
import { webStyles } from '../components/theme/web-styles';

// The page itself scrolls (react-native-web's own reset would pin the body), and the app fills at least the window.
// Nothing may zoom text behind the reader's back, and a field that gets focus must not hide under the dock.
const baseStyles = `
*{box-sizing:border-box}
html{-webkit-text-size-adjust:100%;text-size-adjust:100%;background:#F5EFE2;color:#12302A}
body{margin:0;min-height:100vh;min-height:100dvh;overflow-x:hidden;overflow-y:auto}
#root{display:flex;flex-direction:column;min-height:100vh;min-height:100dvh}
noscript p{max-width:34rem;margin:2rem auto;padding:0 1rem;font:18px/1.5 system-ui,sans-serif}
`.trim();

/** The document around every page; rendered at export only, so it may use nothing that needs a browser. */
export default function Document({ children }: { children: ReactNode }) {
  return (
    <html lang="en-US">
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1, viewport-fit=cover" />
        <meta name="theme-color" content="#F5EFE2" />
        <meta
          name="description"
          content="An honest price for a charging circuit at home, tonight, from your couch: answer a few questions, see what it depends on."
        />
        <style id="base" dangerouslySetInnerHTML={{ __html: baseStyles + webStyles }} />
      </head>
      <body>
        <noscript>
          <p>
            This page works out your price as you answer, so it needs JavaScript. Please turn it on, or call us: we are glad to go
            through the same questions with you on the phone.
          </p>
        </noscript>
        {children}
      </body>
    </html>
  );
}
