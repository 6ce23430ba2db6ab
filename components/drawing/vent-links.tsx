import type { Vent } from "@/lib/document/schema";

/** Which vent is drawn, how many of it there are, and the way to the others. */
export function VentLinks({
  vents,
  shown,
  onVent,
}: {
  vents: Vent[];
  shown: number;
  onVent?: (index: number) => void;
}) {
  const named = (vent: Vent) => (vent.count > 1 ? `${vent.name}, ${vent.count} alike` : vent.name);
  const only = vents[0];
  if (!only || (vents.length === 1 && only.count === 1)) return null;
  if (vents.length === 1) return <p className="lettering text-sm">{named(only)}</p>;
  return (
    <ul className="lettering flex flex-wrap gap-x-3 text-sm" aria-label="Vents of this design">
      {vents.map((vent, index) => (
        <li key={index}>
          {index === shown || !onVent ? (
            <span
              className={index === shown ? "font-semibold" : "text-ink-2"}
              aria-current={index === shown ? "true" : undefined}
            >
              {named(vent)}
            </span>
          ) : (
            <button type="button" className="thumb link" onClick={() => onVent(index)}>
              {named(vent)}
            </button>
          )}
        </li>
      ))}
    </ul>
  );
}
