interface YearFailureProps {
  failure: string | undefined;
  /** a last good year is still on the page */
  stale: boolean;
  onRetry(): void;
}

/** Why there is no newer year, and the way to ask again; the last good one stays where it is. */
export function YearFailure({ failure, stale, onRetry }: YearFailureProps) {
  if (failure === undefined) return null;
  return (
    <p role="alert" className="mt-2 text-hot-text">
      <strong>This year could not be worked.</strong> {failure}
      {stale && ' What you see is the last year that could.'}{' '}
      <button type="button" className="word" onClick={onRetry}>
        Work it again
      </button>
    </p>
  );
}
