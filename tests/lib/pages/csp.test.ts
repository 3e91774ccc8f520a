import { createHash } from 'node:crypto';
import { getScriptNonceFromHeader } from 'next/dist/server/app-render/get-script-nonce-from-header';
import { createElement, Suspense, use } from 'react';
import { renderToReadableStream } from 'react-dom/server';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { noncePolicy, policyOf, scriptSources } from '@/lib/pages/csp.mjs';

const source = (script: string) => `'sha256-${createHash('sha256').update(script).digest('base64')}'`;
const page = (...scripts: string[]) =>
  `<html><body>${scripts.map((s) => `<script>${s}</script>`).join('')}</body></html>`;
const inlineScripts = (html: string) =>
  [...html.matchAll(/<script\b[^>]*>([\s\S]*?)<\/script>/g)].map((match) => match[1] ?? '').filter(Boolean);

const START = '(self.__next_f=self.__next_f||[]).push([0])';
const DATA = 'self.__next_f.push([1,"a \\u003c/script> b"])';
const CHUNKS = '(globalThis["TURBOPACK"] || (globalThis["TURBOPACK"] = [])).push({"otherChunks":["a.js"]});';

beforeEach(() => {
  vi.stubEnv('BASE_URL', 'http://127.0.0.1:4200');
});

afterEach(() => {
  vi.unstubAllEnvs();
});

/** A page whose late part React puts in place with scripts of its own. */
async function latePage() {
  const late = new Promise<string>((resolve) => setTimeout(() => resolve('late'), 20));
  const Late = () => createElement('p', null, use(late));
  const body = createElement(Suspense, { fallback: 'waiting' }, createElement(Late));
  const stream = await renderToReadableStream(createElement('html', null, createElement('body', null, body)));
  return new Response(stream).text();
}

describe('the policy of a stored page', () => {
  it.each([START, DATA, CHUNKS])('hashes the framework’s data: %s', (script) => {
    expect(policyOf(page(script))).toContain(source(script));
  });

  it.each([
    'alert(1)',
    'self.__next_f.push([1,"a"]);alert(1)',
    'self.__next_f.push([1,alert(1)])',
    'self.__next_f.push(alert(1))',
    `${START};alert(1)//)`,
    '$RC("B:0","S:0");alert(1)',
    'alert(1);$RC("B:0","S:0")',
  ])('never hashes a planted script: %s', (script) => {
    const policy = policyOf(page(DATA, script));
    expect(policy).not.toContain(source(script));
    expect(policy).toContain(source(DATA));
  });

  it('hashes every script of a late part, as this React writes it', async () => {
    const html = await latePage();
    const scripts = inlineScripts(html);
    expect(scripts.join()).toContain('$RC("B:0","S:0")');
    for (const script of scripts) expect(policyOf(html)).toContain(source(script));
  });

  it('allows nothing inline or evaluated, and nothing from elsewhere by default', () => {
    expect(policyOf(page(DATA))).not.toMatch(/unsafe-|strict-dynamic|\*/);
    expect(policyOf(page(DATA))).toContain("default-src 'none'");
  });
});

describe('where scripts may come from', () => {
  it('is the build output and settle.js of the site, by path', () => {
    expect(scriptSources('https://air.example')).toBe(
      'https://air.example/_next/static/ https://air.example/settle.js',
    );
  });

  it('is both spellings of a loopback address, at its port', () => {
    const sources = scriptSources('http://localhost:4200').split(' ');
    expect(sources).toContain('http://127.0.0.1:4200/_next/static/');
    expect(sources).toContain('http://localhost:4200/settle.js');
    expect(sources).toHaveLength(4);
  });

  it('follows BASE_URL', () => {
    vi.stubEnv('BASE_URL', 'https://air.example');
    expect(policyOf(page())).toMatch(/script-src https:\/\/air\.example\/_next\/static\/ /);
  });
});

describe('the policy of a page made for one request', () => {
  it('carries a nonce that Next finds', () => {
    expect(getScriptNonceFromHeader(noncePolicy('bm9uY2U='))).toBe('bm9uY2U=');
  });

  it('lets the stored page for a missing address run its own data, and nothing else in it', () => {
    const policy = noncePolicy('bm9uY2U=', page(DATA, 'alert(1)'));
    expect(policy).toContain(source(DATA));
    expect(policy).not.toContain(source('alert(1)'));
  });
});
