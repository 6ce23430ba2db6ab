interface SkeletonProps {
  /** Size and place, as classes. */
  className?: string;
}

/** The outline of what is coming, as a drawing's frame stands before its lines. */
export function Skeleton({ className = "h-4 w-24" }: SkeletonProps) {
  return <span aria-hidden className={`skeleton ${className}`} />;
}
