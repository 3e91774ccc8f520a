import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, expect, it } from 'vitest';
import { packagesAreIn } from '@/scripts/lib/packages.mjs';

const LOCKED = {
  '': { name: 'project', version: '1.0.0' },
  'node_modules/one': { version: '1.2.3' },
  'node_modules/one/node_modules/two': { version: '2.0.0' },
  'node_modules/for-another-system': { version: '1.0.0', optional: true },
};
const INSTALLED = {
  'node_modules/one': { version: '1.2.3' },
  'node_modules/one/node_modules/two': { version: '2.0.0' },
};

let root: string;

beforeEach(() => {
  root = mkdtempSync(join(tmpdir(), 'packages-'));
  mkdirSync(join(root, 'node_modules'));
  writeFileSync(join(root, 'package-lock.json'), JSON.stringify({ packages: LOCKED }));
});
afterEach(() => rmSync(root, { recursive: true }));

const install = (packages: object) =>
  writeFileSync(join(root, 'node_modules/.package-lock.json'), JSON.stringify({ packages }));

describe('the packages', () => {
  it('are in when npm lists every one that the lock file names', () => {
    install(INSTALLED);
    expect(packagesAreIn(root)).toBe(true);
  });

  it('are not in when npm never came to the end of installing', () => {
    expect(packagesAreIn(root)).toBe(false);
  });

  it('are not in when one is of another version', () => {
    install({ ...INSTALLED, 'node_modules/one': { version: '1.2.2' } });
    expect(packagesAreIn(root)).toBe(false);
  });

  it('are not in when one is lacking', () => {
    install({ 'node_modules/one': { version: '1.2.3' } });
    expect(packagesAreIn(root)).toBe(false);
  });

  it('are not in when one that may be lacking is of another version', () => {
    install({ ...INSTALLED, 'node_modules/for-another-system': { version: '0.9.0' } });
    expect(packagesAreIn(root)).toBe(false);
  });
});
