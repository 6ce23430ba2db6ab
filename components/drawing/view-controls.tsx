/** Closer, farther, whole sheet: the buttons behind pinch and wheel. */
export function ViewControls({
  zoom,
  onZoom,
  onFit,
}: {
  zoom: number;
  onZoom: (factor: number) => void;
  onFit: () => void;
}) {
  const button =
    "thumb lettering inline-flex h-7 min-w-7 items-center justify-center border border-rule bg-film px-2 text-sm text-ink-2 hover:text-ink disabled:opacity-40";
  return (
    <div role="group" aria-label="Size of the drawing" className="flex">
      <button
        type="button"
        className={`${button} rounded-l-sm`}
        aria-label="Farther"
        disabled={zoom <= 1}
        onClick={() => onZoom(1 / 1.5)}
      >
        −
      </button>
      <button
        type="button"
        className={`${button} -ml-px`}
        aria-label="Closer"
        onClick={() => onZoom(1.5)}
      >
        +
      </button>
      <button
        type="button"
        className={`${button} -ml-px rounded-r-sm`}
        disabled={zoom <= 1}
        onClick={onFit}
      >
        Fit
      </button>
    </div>
  );
}
