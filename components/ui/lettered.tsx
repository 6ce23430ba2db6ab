/** Symbols as the trade writes them: `f_B` with its index below the line. */
export function Lettered({ text }: { text: string }) {
  return text
    .split(/(_[A-Za-z0-9]+)/)
    .map((part, at) => (part.startsWith("_") ? <sub key={at}>{part.slice(1)}</sub> : part));
}
