/** Shown while the design is read from the database. */
export default function Loading() {
  return (
    <p className="pt-7 font-display text-verdict text-muted" role="status">
      The design is being fetched.
    </p>
  );
}
