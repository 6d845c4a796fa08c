import express from 'express';
import { createHash } from 'node:crypto';
import { mkdtempSync, mkdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { brotliCompressSync, gzipSync } from 'node:zlib';
import request from 'supertest';
import { securityHeaders } from '../../../server/http/security';
import { serveWebApp } from '../../../server/http/web-app';

// Invented pages in the shape that the exporter gives. Header names and their meaning: RFC 9110 (HTTP semantics),
// RFC 8246 (immutable), W3C Content Security Policy Level 3.
const script = 'globalThis.hydrate=true;';
const style = '.a{color:red}';
const sha256 = (text: string) => `sha256-${createHash('sha256').update(text).digest('base64')}`;
const page = (name: string, css = style) =>
  `<html><head><style id="s">${css}</style><script type="module">${script}</script></head><body>${name}<script src="/x.js" defer></script></body></html>`;
const hashedScript = '/_expo/static/js/web/entry-128b3cc903da69aeedb2de74fadd7216.js';
const files: Record<string, string | Buffer> = {
  'index.html': page('start'),
  'quote/index.html': page('quote start'),
  'quote/[step].html': page('any step'),
  'quote/price.html': page('the price', '.p{}'),
  'my/[token].html': page('my job'),
  '+not-found.html': page('nothing here'),
  '_expo/.routes.json': '{}',
  '.secret': 'never',
  [hashedScript.slice(1)]: 'run()',
  [`${hashedScript.slice(1)}.br`]: brotliCompressSync('run()'),
  [`${hashedScript.slice(1)}.gz`]: gzipSync('run()'),
  'favicon.ico': 'icon',
};

describe('the exported web app', () => {
  const distDir = mkdtempSync(join(tmpdir(), 'web-app-'));
  let agent: ReturnType<typeof request>;

  beforeAll(() => {
    for (const [file, content] of Object.entries(files)) {
      mkdirSync(dirname(join(distDir, file)), { recursive: true });
      writeFileSync(join(distDir, file), content);
    }
    const webApp = serveWebApp(distDir);
    const app = express();
    app.use(securityHeaders(webApp.inlineScriptHashes, { https: false }), webApp.router);
    agent = request(app);
  });
  afterAll(() => rmSync(distDir, { recursive: true, force: true }));

  it.each([
    ['/', 'start'], ['/quote', 'quote start'], ['/quote/panel', 'any step'], ['/quote/price?part=2', 'the price'], ['/my/abc', 'my job'],
  ])('answers %s with its own page', async (address, words) => {
    const response = await agent.get(address).expect(200);
    expect(response.text).toContain(words);
    expect(response.headers['content-type']).toContain('text/html');
    expect(response.headers['cache-control']).toBe('no-cache');
  });

  it.each(['/nowhere', '/my/abc/def', '/my/a%2Fb', '/%E0%A4%A', '/..%2F..%2Fetc%2Fpasswd', '/[step]', '//evil.example/'])(
    'answers %s with the not-found page and 404',
    async (address) => {
      const response = await agent.get(address).expect(404);
      expect(response.text).toContain('nothing here');
    },
  );

  it.each(['/.secret', '/_expo/.routes.json', `${hashedScript}.br`, '/index.html'])('never gives out %s', async (address) => {
    const response = await agent.get(address).expect(404);
    expect(response.text).toContain('nothing here');
  });

  it('sends an address with a slash at its end on to the one without, with its query', async () => {
    const response = await agent.get('/quote/panel/?part=odd').expect(308);
    expect(response.headers.location).toBe('/quote/panel?part=odd');
  });

  it('sends the best form that the browser takes, and says that the forms differ', async () => {
    const brotli = await agent.get(hashedScript).set('Accept-Encoding', 'gzip, br').expect(200);
    expect(brotli.headers).toMatchObject({ 'content-encoding': 'br', vary: 'Accept-Encoding', 'content-type': expect.stringContaining('javascript') });
    const gzip = await agent.get(hashedScript).set('Accept-Encoding', 'gzip').expect(200);
    expect(gzip.headers['content-encoding']).toBe('gzip');
    expect(gzip.text).toBe('run()');
    const plain = await agent.get(hashedScript).set('Accept-Encoding', 'identity').expect(200);
    expect(plain.headers['content-encoding']).toBeUndefined();
    expect(plain.headers.etag).not.toBe(gzip.headers.etag);
  });

  it('lets files with a hash in their name be kept for ever, and answers 304 to a copy that is still good', async () => {
    const first = await agent.get(hashedScript).expect(200);
    expect(first.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    await agent.get('/favicon.ico').expect(200).expect('Cache-Control', 'no-cache');
    await agent.get(hashedScript).set('If-None-Match', first.headers.etag ?? '').expect(304);
  });

  it('lets through exactly the inline script and the page’s own inline styles', async () => {
    const policy = (await agent.get('/quote/price').expect(200)).headers['content-security-policy'];
    expect(policy).toContain(`script-src 'self' '${sha256(script)}';`);
    expect(policy).toContain(`style-src-elem 'self' '${sha256('.p{}')}';`);
    expect(policy).not.toContain(sha256(style));
    expect(policy).toContain("frame-ancestors 'none'");
  });

  it('leaves other methods to others', async () => {
    await agent.post('/').expect(404).expect('Content-Type', /text\/html/);
    await agent.head('/').expect(200);
  });

  it('says what to do when there is no export', () => {
    expect(() => serveWebApp(join(distDir, 'quote'))).toThrow('npm run export');
  });
});

describe('the security headers', () => {
  const headersOf = async (https: boolean) => {
    const app = express();
    app.use(securityHeaders([], { https, paymentOrigins: ['http://127.0.0.1:4000'] }));
    app.get('/', (_request, response) => {
      response.json({});
    });
    return (await request(app).get('/')).headers;
  };

  it('insist on https only where the public reaches us by https', async () => {
    expect((await headersOf(false))['strict-transport-security']).toBeUndefined();
    expect((await headersOf(true))['strict-transport-security']).toBe('max-age=31536000');
  });
  it('tell no other site where a visitor came from, nor what serves the page', async () => {
    const headers = await headersOf(false);
    expect(headers['referrer-policy']).toBe('no-referrer');
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['permissions-policy']).toContain('camera=(self)');
    expect(headers['content-security-policy']).toContain("form-action 'self' https://checkout.stripe.com http://127.0.0.1:4000;");
    expect(headers['content-security-policy']).not.toMatch(/script-src[^;]*unsafe/);
  });
});
