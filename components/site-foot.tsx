import Link from 'next/link';
import { ENGINE_VERSION } from '@/lib/simulation/engine-version';

const LINKS = [
  { href: '/method', text: 'How it computes' },
  { href: '/validation', text: 'Validation' },
  { href: '/method/limits', text: 'Limits and cautions' },
  { href: '/method/changes', text: 'Results that change' },
] as const;

/** The foot of every page: where the figures come from, and by which engine. */
export function SiteFoot() {
  return (
    <footer
      className="flex flex-wrap items-center gap-x-6 border-t border-ink pt-2 pb-6 text-note"
      data-screen-only
    >
      <nav aria-label="Method" className="contents">
        {LINKS.map(({ href, text }) => (
          <Link key={href} href={href} className="inline-flex min-h-9 items-center">
            {text}
          </Link>
        ))}
      </nav>
      <p className="text-muted sm:ml-auto">engine {ENGINE_VERSION}</p>
    </footer>
  );
}
