export type Status = "within" | "near" | "over" | "unknown";

const words: Record<Status, string> = {
  within: "Within its limit",
  near: "Near its limit",
  over: "Over its limit",
  unknown: "Not known",
};

const tones: Record<Status, string> = {
  within: "text-within",
  near: "text-near",
  over: "text-over",
  unknown: "text-ink-2",
};

interface StatusMarkProps {
  status: Status;
  /** Instead of the usual words. */
  label?: string;
}

/** How a check stands, by its form first: a check mark, a half-filled triangle, an octagon, a dash. */
export function StatusMark({ status, label }: StatusMarkProps) {
  return (
    <svg
      width="16"
      height="16"
      viewBox="0 0 16 16"
      role="img"
      aria-label={label ?? words[status]}
      className={`mt-0.5 shrink-0 ${tones[status]}`}
      data-status={status}
    >
      <title>{label ?? words[status]}</title>
      {status === "within" && (
        <path d="M2.5 8.5 6.5 12.5 13.5 4" fill="none" stroke="currentColor" strokeWidth="2" />
      )}
      {status === "near" && (
        <>
          <path d="M8 2 14.5 14h-13z" fill="none" stroke="currentColor" strokeWidth="1.4" />
          <path d="M8 2v12H1.5z" fill="currentColor" />
        </>
      )}
      {status === "over" && (
        <path d="M5.3 1.5h5.4l3.8 3.8v5.4l-3.8 3.8H5.3L1.5 10.7V5.3z" fill="currentColor" />
      )}
      {status === "unknown" && (
        <path d="M3 8h10" fill="none" stroke="currentColor" strokeWidth="2" strokeDasharray="3 2" />
      )}
    </svg>
  );
}
