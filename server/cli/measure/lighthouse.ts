import { launch } from 'chrome-launcher';
import { chromiumFlags, chromiumPath } from '../lib/chromium-launch.cjs';
import { quantile, type Row } from './table';

// Targets: the project's goals, "Lighthouse mobile, median of 5".
const targets = { performance: 95, accessibility: 100, 'best-practices': 100, seo: 100 } as const;
const runs = 5;

/** Runs Lighthouse as on a mid-range phone, five times because it jumps, and gives the median of each category. */
export async function lighthouseRows(url: string): Promise<Row[]> {
  const { default: lighthouse } = await import('lighthouse');
  const scores = new Map<string, number[]>();
  for (let run = 0; run < runs; run += 1) {
    const chrome = await launch({ chromePath: chromiumPath, chromeFlags: ['--headless=new', ...chromiumFlags], logLevel: 'silent' });
    try {
      const result = await lighthouse(url, { port: chrome.port, logLevel: 'silent', onlyCategories: Object.keys(targets) });
      for (const name of Object.keys(targets)) {
        const score = result?.lhr.categories[name]?.score;
        if (score === null || score === undefined) throw new Error(`Lighthouse gave no score for ${name}: ${result?.lhr.runtimeError?.message ?? ''}`);
        scores.set(name, [...(scores.get(name) ?? []), Math.round(score * 100)]);
      }
    } finally {
      chrome.kill();
    }
  }
  return Object.entries(targets).map(([name, target]) => {
    const values = scores.get(name) ?? [];
    const median = quantile(values, 0.5);
    return { what: `Lighthouse mobile, ${name}`, measured: `${median} (${values.join(', ')})`, target: String(target), reached: median >= target };
  });
}
