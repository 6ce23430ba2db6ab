import type { SVGProps } from "react";

/** Strokes on a 16 px field, drawn like the rest: one weight, square ends. */
const paths = {
  up: "M8 13V3M4 7l4-4 4 4",
  down: "M8 3v10M4 9l4 4 4-4",
  left: "M13 8H3M7 4 3 8l4 4",
  right: "M3 8h10M9 4l4 4-4 4",
  add: "M8 3v10M3 8h10",
  remove: "M3 8h10",
  close: "M4 4l8 8M12 4l-8 8",
  check: "M3 8.5 6.5 12 13 4.5",
  chevron: "M4 6l4 4 4-4",
  more: "M3 8h.01M8 8h.01M13 8h.01",
  undo: "M6 3 3 6l3 3M3 6h6a4 4 0 0 1 0 8H7",
  redo: "M10 3l3 3-3 3M13 6H7a4 4 0 0 0 0 8h2",
  copy: "M6 6h7v7H6zM3 10V3h7",
  edit: "M3 13l.8-3.2L10.5 3 13 5.5 6.2 12.2zM9 4.6 11.4 7",
  bin: "M3 5h10M6.5 5V3h3v2M4.5 5l.7 8h5.6l.7-8",
  open: "M4 12 12 4M6 4h6v6",
  sun: "M8 5.2a2.8 2.8 0 1 1 0 5.6 2.8 2.8 0 0 1 0-5.6zM8 1v1.6M8 13.4V15M1 8h1.6M13.4 8H15M3 3l1.1 1.1M11.9 11.9 13 13M3 13l1.1-1.1M11.9 4.1 13 3",
  moon: "M13 9.5A5.5 5.5 0 0 1 6.5 3 5.5 5.5 0 1 0 13 9.5z",
  device: "M2 3h12v8H2zM6 14h4M8 11v3",
  person: "M8 8a2.6 2.6 0 1 0 0-5.2A2.6 2.6 0 0 0 8 8zM3 14c.4-2.8 2.2-4.2 5-4.2s4.6 1.4 5 4.2",
  menu: "M2 4.5h12M2 8h12M2 11.5h12",
  larger: "M9.5 3H13v3.5M13 3 9 7M6.5 13H3V9.5M3 13l4-4",
} as const;

export type IconName = keyof typeof paths;

interface IconProps extends Omit<SVGProps<SVGSVGElement>, "name"> {
  name: IconName;
  /** Said to screen readers; an icon beside its own words has none. */
  label?: string;
}

export function Icon({ name, label, ...rest }: IconProps) {
  return (
    <svg
      width="16"
      height="16"
      viewBox="0 0 16 16"
      fill="none"
      stroke="currentColor"
      strokeWidth={name === "more" ? 2.2 : 1.6}
      strokeLinecap={name === "more" ? "round" : "square"}
      strokeLinejoin="miter"
      role={label ? "img" : undefined}
      aria-label={label}
      aria-hidden={label ? undefined : true}
      data-icon={name}
      {...rest}
    >
      <path d={paths[name]} />
    </svg>
  );
}
