import type { DimensionRow } from "@/lib/drawing/describe";

/** The dimensions as a table: the drawing's twin for reading and for screen readers. */
export function DimensionTable({ rows, summary }: { rows: DimensionRow[]; summary: string }) {
  return (
    <details className="group relative text-sm">
      <summary className="thumb lettering inline-flex items-center py-1 text-scribe">
        Dimensions
      </summary>
      <div className="absolute bottom-full left-0 z-10 max-h-72 w-80 max-w-[calc(100vw-2rem)] overflow-auto rounded-sm border border-edge bg-sheet p-3">
        <p className="max-w-prose py-1 text-ink-2">{summary}</p>
        <table className="lettering w-full max-w-md">
          <caption className="sr-only">Dimensions of the airway</caption>
          <thead>
            <tr className="border-b border-rule text-left text-ink-2">
              <th scope="col" className="py-1 font-normal">
                Dimension
              </th>
              <th scope="col" className="py-1 text-right font-normal">
                Value
              </th>
            </tr>
          </thead>
          <tbody>
            {rows.map((row, index) => (
              <tr key={index} className="border-b border-rule">
                <th scope="row" className="py-1 text-left font-normal">
                  {row.name}
                </th>
                <td className="py-1 text-right">{row.value}</td>
              </tr>
            ))}
          </tbody>
        </table>
      </div>
    </details>
  );
}
