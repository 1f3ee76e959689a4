import type { ComponentProps } from "react";
import { buttonClass, type ButtonLook, type ButtonSize } from "./button-class";

export interface ButtonProps extends ComponentProps<"button"> {
  /** 'dashed': not ready yet. It stays reachable, and pressing it says what is missing. */
  look?: ButtonLook;
  /** 44, 48 (bottom bars), 56 (entry), 64 (the form's save) px tall; the door's is 64, 56 on a tablet. */
  size?: ButtonSize;
}

export function Button({ look = "quiet", size = "control", className = "", type = "button", ...rest }: ButtonProps) {
  return <button type={type} className={`${buttonClass(look, size)} ${className}`} {...rest} />;
}
