import type { ButtonHTMLAttributes } from "react";
import { Icon, type IconName } from "./icons";

interface IconButtonProps extends Omit<ButtonHTMLAttributes<HTMLButtonElement>, "children"> {
  icon: IconName;
  /** Its name, in words; shown when pointed at. */
  label: string;
}

/** A button that is only a sign; at least 24 px, 44 px under a finger. */
export function IconButton({ icon, label, className = "", ...rest }: IconButtonProps) {
  return (
    <button
      type="button"
      aria-label={label}
      title={label}
      className={`icon-button ${className}`}
      {...rest}
    >
      <Icon name={icon} />
    </button>
  );
}
