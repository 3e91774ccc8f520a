import nextVitals from 'eslint-config-next/core-web-vitals';
import nextTypescript from 'eslint-config-next/typescript';
import { defineConfig, globalIgnores } from 'eslint/config';

const DATABASE_ONLY = {
  patterns: [
    { regex: '^(knex|mysql2)(/.*)?$', message: 'The database is reached through lib/database.ts only.' },
    { regex: '^@/db(/.*)?$', message: 'Only lib/database.ts imports db/.' },
  ],
};

const RAW_HTML = {
  selector: "JSXAttribute[name.name='dangerouslySetInnerHTML']",
  message: 'Only components/entries/prose.tsx writes HTML, which it has cleaned.',
};
const INLINE_STYLE = {
  selector: "JSXOpeningElement[name.name=/^[a-z]/] > JSXAttribute[name.name='style']",
  message: 'The content policy blocks style attributes: use a class.',
};
const SPLICED_SQL = {
  selector: "CallExpression[callee.property.name='raw'] > TemplateLiteral.arguments[expressions.length>0]",
  message: 'Pass values to raw() as bindings, never inside the text.',
};

const config = defineConfig([
  ...nextVitals,
  ...nextTypescript,
  {
    rules: {
      '@typescript-eslint/no-explicit-any': 'error',
      '@typescript-eslint/ban-ts-comment': 'error',
      'no-restricted-syntax': ['error', RAW_HTML, INLINE_STYLE, SPLICED_SQL],
      'no-restricted-imports': ['error', DATABASE_ONLY],
    },
  },
  {
    files: ['components/entries/prose.tsx'],
    rules: { 'no-restricted-syntax': ['error', INLINE_STYLE, SPLICED_SQL] },
  },
  {
    files: ['db/**', 'lib/database.ts', 'scripts/**', 'tests/**'],
    rules: { 'no-restricted-imports': 'off' },
  },
  globalIgnores(['.next/**', '.next-*/**', 'coverage/**', 'next-env.d.ts', '.data/**', 'test-results/**']),
]);

export default config;
