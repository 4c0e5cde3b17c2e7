interface ChooseDesignsProps {
  designs: readonly { id: string; name: string }[];
  chosen: readonly string[];
  most: number;
}

/** Which designs stand in the comparison; the choice is part of the address. */
export function ChooseDesigns({ designs, chosen, most }: ChooseDesignsProps) {
  return (
    <form method="get" className="mt-8 pt-3 rule-ink" data-screen-only>
      <fieldset className="flex flex-wrap items-center gap-x-6 gap-y-2">
        <legend className="mb-1 font-display text-h3 font-heading">Designs in this comparison</legend>
        {designs.map(({ id, name }) => (
          <label key={id} className="flex min-h-7 items-center gap-2 pointer-coarse:min-h-11">
            <input
              type="checkbox"
              name="design"
              value={id}
              defaultChecked={chosen.includes(id)}
              className="size-4 accent-ink"
            />
            {name}
          </label>
        ))}
        <button type="submit" className="framed">
          Compare these
        </button>
        <span className="text-note text-muted">two to {most}</span>
      </fieldset>
    </form>
  );
}
