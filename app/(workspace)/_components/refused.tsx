import { notFound, redirect } from 'next/navigation';
import type { Refusal } from '@/lib/schemas/answer';

interface RefusedProps {
  refusal: Refusal;
  /** path to come back to after signing in */
  from?: string;
}

/** What a page shows instead of its content: the way to the sign-in, "not there", or the reason in words. */
export function Refused({ refusal, from = '/projects' }: RefusedProps) {
  if (refusal.code === 'signed out') redirect(`/sign-in?to=${encodeURIComponent(from)}`);
  if (refusal.code === 'not found') notFound();
  return (
    <section role="alert" className="max-w-[34rem] pt-10">
      <h1 className="mb-4">This page cannot be shown just now.</h1>
      <p className="mb-4">{refusal.message}</p>
      <p>
        <a href={from} className="framed">
          Try again
        </a>
      </p>
    </section>
  );
}
