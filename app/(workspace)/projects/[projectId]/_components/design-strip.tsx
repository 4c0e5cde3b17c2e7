'use client';

import { useParams, usePathname } from 'next/navigation';
import { HeadLinks } from '@/components/head-links';

interface DesignStripProps {
  projectId: string;
  designs: readonly { id: string; name: string }[];
}

/** On the pages of a design: the same page of the project's other designs. */
export function DesignStrip({ projectId, designs }: DesignStripProps) {
  const path = usePathname();
  const { designId } = useParams<{ designId?: string }>();
  if (!designId || designs.length < 2) return null;
  const base = `/projects/${projectId}/designs/`;
  const page = path.slice(base.length + designId.length);
  return (
    <nav aria-label="Designs" className="pt-1 text-note">
      <HeadLinks
        links={designs.map(({ id, name }) => ({
          href: `${base}${id}${page}`,
          word: name,
          current: id === designId,
        }))}
      />
    </nav>
  );
}
