export interface TitleBlockText {
  /** What the sheet shows; "Airway, section" where nothing is said. */
  drawing?: string;
  revision?: string;
  date?: string;
  drawnBy?: string;
  checkedBy?: string;
}

/** The title block of a sheet. Lines that nobody has filled in are left out. */
export function TitleBlock({
  text,
  scale,
  units,
}: {
  text: TitleBlockText;
  scale: string;
  units: string;
}) {
  const cells: [string, string | undefined][] = [
    ["Drawing", text.drawing ?? "Airway, section"],
    ["Scale", scale],
    ["Units", units],
    ["Revision", text.revision],
    ["Date", text.date],
    ["Drawn", text.drawnBy],
    ["Checked", text.checkedBy],
  ];
  return (
    <dl className="lettering flex flex-wrap sm:max-w-108 border-t border-l border-rule text-xs">
      {cells
        .filter((cell): cell is [string, string] => cell[1] !== undefined)
        .map(([name, value]) => (
          <div
            key={name}
            className="flex grow gap-1.5 border-r border-b border-rule px-2 py-0.5 whitespace-nowrap"
          >
            <dt className="text-ink-2">{name}</dt>
            <dd>{value}</dd>
          </div>
        ))}
    </dl>
  );
}
