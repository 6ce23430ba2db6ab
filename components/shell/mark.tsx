/** Our mark: an airway in section, flared at its mouth, with two rings on either wall. */
export function Mark({ className = "" }: { className?: string }) {
  return (
    <svg
      width="26"
      height="24"
      viewBox="0 0 26 24"
      fill="none"
      aria-hidden
      className={className}
      data-mark
    >
      <path
        d="M2 3c0 4 2.2 6 6 6h16M2 21c0-4 2.2-6 6-6h16"
        stroke="currentColor"
        strokeWidth="2.4"
      />
      <path d="M13.5 2.5h3.6v5h-3.6zM18.7 2.5h3.6v5h-3.6z" className="fill-ply-dark" />
      <path d="M13.5 16.5h3.6v5h-3.6zM18.7 16.5h3.6v5h-3.6z" className="fill-ply-dark" />
    </svg>
  );
}
