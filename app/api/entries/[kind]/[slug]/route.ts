import { handle, textWithEtag } from '@/lib/api/handle';
import { problem } from '@/lib/api/problem';
import { readQuery } from '@/lib/api/read-query';
import { findEntry } from '@/lib/entries/find-entry';
import { entryQuestion } from '@/lib/entries/list-schema';
import { presentEntry } from '@/lib/entries/present';
import { AnswerCache } from '@/lib/search/answer-cache';
import { liveLibrary } from '@/lib/search/live-library';

export const dynamic = 'force-dynamic';

/** Its HTML is rendered once a revision: a Markdown parser costs milliseconds. */
const answers = new AnswerCache();
const JSON_TYPE = 'application/json; charset=utf-8';

type Context = { params: Promise<{ kind: string; slug: string }> };

const wantsMarkdown = (request: Request) => /^text\/markdown\b/.test(request.headers.get('accept')?.trim() ?? '');

export const GET = handle<Context>('entry', async (request, { params }) => {
  const question = readQuery(request.url, entryQuestion);
  if (!question.ok) return problem(question);
  const { kind, slug } = await params;
  const { library } = await liveLibrary();
  const entry = await findEntry(library, kind, slug, question.value.revision);
  if (!entry.ok) return problem(entry);
  if (wantsMarkdown(request))
    return textWithEtag(request, entry.value.text, { 'content-type': 'text/markdown; charset=utf-8', vary: 'Accept' });
  const key = `${library.version} ${kind}:${slug} ${entry.value.revision}`;
  const text = answers.take(key, () => JSON.stringify(presentEntry(library, entry.value)));
  return textWithEtag(request, text, { 'content-type': JSON_TYPE, vary: 'Accept' });
});
