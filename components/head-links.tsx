'use client';

import Link from 'next/link';
import { useEffect, useRef } from 'react';

export interface HeadLink {
  href: string;
  word: string;
  current: boolean;
}

interface HeadLinksProps {
  links: readonly HeadLink[];
  /** on a phone: break the line instead of letting it scroll */
  wrap?: boolean;
}

/** Links of the running head: side by side, and on a phone one line that scrolls in itself to the page one is on. */
export function HeadLinks({ links, wrap = false }: HeadLinksProps) {
  const list = useRef<HTMLUListElement>(null);
  const here = links.find(({ current }) => current)?.href;

  useEffect(() => {
    const line = list.current;
    const link = line?.querySelector<HTMLElement>('[aria-current]');
    if (line && link) line.scrollLeft = link.offsetLeft - (line.clientWidth - link.offsetWidth) / 2;
  }, [here]);

  return (
    <ul
      ref={list}
      className={`relative -m-1 flex gap-x-5 p-1 ${wrap ? 'flex-wrap' : 'max-sm:overflow-x-auto sm:flex-wrap'}`}
    >
      {links.map(({ href, word, current }) => (
        <li key={href}>
          <Link
            href={href}
            aria-current={current ? 'page' : undefined}
            className={`inline-flex min-h-9 items-center border-b-2 whitespace-nowrap no-underline hover:underline pointer-coarse:min-h-11 ${current ? 'border-ink font-strong' : 'border-transparent'}`}
          >
            {word}
          </Link>
        </li>
      ))}
    </ul>
  );
}
