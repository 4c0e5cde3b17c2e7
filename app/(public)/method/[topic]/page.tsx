import type { Metadata } from 'next';
import Link from 'next/link';
import { notFound } from 'next/navigation';
import { EntrySection } from '@/components/method/entry-section';
import { Prose } from '@/components/method/method-text';
import { methodPages } from '@/lib/method/method-page';
import type { MethodPage } from '@/lib/method/method-page';
import { TOPICS } from '@/lib/method/topics';

/** Written once, while the product is built: the sources are at hand then and do not change afterwards. */
export const dynamic = 'force-static';
export const dynamicParams = false;

interface TopicPageProps {
  params: Promise<{ topic: string }>;
}

export function generateStaticParams() {
  return TOPICS.map(({ id }) => ({ topic: id }));
}

export async function generateMetadata({ params }: TopicPageProps): Promise<Metadata> {
  const { topic } = await params;
  return { title: TOPICS.find(({ id }) => id === topic)?.title };
}

/** Every equation of one subject, with its symbols, source, range and checks. */
export default async function TopicPage({ params }: TopicPageProps) {
  const { topic } = await params;
  const page = methodPages().find((one) => one.topic.id === topic);
  if (!page) notFound();
  return (
    <div className="grid gap-x-10 gap-y-6 pt-7 lg:grid-cols-[200px_minmax(0,1fr)]">
      <Contents page={page} />
      <div className="min-w-0">
        <h1>{page.topic.title}</h1>
        <p className="mt-2 max-w-[44rem] font-display text-h2">{page.topic.text}</p>
        {page.files.map((file) => (
          <FileSection key={file.file} file={file} />
        ))}
      </div>
    </div>
  );
}

function Contents({ page }: { page: MethodPage }) {
  const at = TOPICS.findIndex(({ id }) => id === page.topic.id);
  const next = TOPICS[at + 1];
  return (
    <nav
      aria-label="Contents of this page"
      className="text-note lg:sticky lg:top-4 lg:max-h-[94vh] lg:self-start lg:overflow-y-auto"
    >
      <p className="mb-2">
        <Link href="/method">How it computes</Link>
      </p>
      <ul className="columns-2 gap-x-6 lg:columns-1">
        {page.files.flatMap(({ entries }) =>
          entries
            .filter(({ name }) => !name.includes('.'))
            .map(({ name, purpose }) => (
              <li key={name} className="break-inside-avoid py-0.5">
                <a href={`#${name}`} className="inline-block min-h-6">
                  <Prose text={purpose} />
                </a>
              </li>
            )),
        )}
      </ul>
      {next && (
        <p className="mt-3 pt-2 rule-ink">
          Next: <Link href={`/method/${next.id}`}>{next.title}</Link>
        </p>
      )}
    </nav>
  );
}

/** "lib/physics/dry-temperature.ts" → "Dry temperature" */
function fileTitle(file: string): string {
  const words = file.replace(/^.*\//, '').replace(/\.ts$/, '').replaceAll('-', ' ');
  return words.charAt(0).toUpperCase() + words.slice(1);
}

function FileSection({ file }: { file: MethodPage['files'][number] }) {
  return (
    <section aria-label={fileTitle(file.file)} className="mt-7">
      <h2>{fileTitle(file.file)}</h2>
      {file.intro
        .split(/\n\s*\n/)
        .filter(Boolean)
        .map((paragraph) => (
          <p key={paragraph} className="mt-1 max-w-[44rem]">
            <Prose text={paragraph} />
          </p>
        ))}
      {file.entries.map((entry) => (
        <EntrySection key={entry.name} entry={entry} />
      ))}
      {file.constants.length > 0 && (
        <dl className="mt-6 max-w-[52rem] pt-2 rule-ink">
          {file.constants.map(({ name, value, meaning }) => (
            <div key={name} className="flex flex-wrap justify-between gap-x-4 py-1 rule-hair">
              <dt>
                <Prose text={meaning} /> <i className="text-note break-words text-muted">{name}</i>
              </dt>
              <dd className="tabular-nums">{value}</dd>
            </div>
          ))}
        </dl>
      )}
    </section>
  );
}
