'use client';

interface ErrorPageProps {
  error: Error & { digest?: string };
  reset: () => void;
}

/** Something failed that nobody expected: said in words, with the way to try again. */
export default function StudyError({ error, reset }: ErrorPageProps) {
  return (
    <section role="alert" className="max-w-[44rem] pt-7">
      <h1 className="mb-3">This study cannot be shown just now.</h1>
      <p className="mb-4">
        The fault is ours, and nothing that was saved is lost. The address of the page still holds your
        levers.
        {error.digest && ` The server’s log knows it as ${error.digest}.`}
      </p>
      <button type="button" className="framed" onClick={reset}>
        Try again
      </button>
    </section>
  );
}
