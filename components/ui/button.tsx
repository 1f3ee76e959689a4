import type { ComponentProps } from "react";
import { buttonClass, type ButtonLook, type ButtonSize } from "./button-class";

export interface ButtonProps extends ComponentProps<"button"> {
  /** 'dashed': not ready yet. It stays reachable, and pressing it says what is missing. */
  look?: ButtonLook;
  /** 44, 48 (bottom bars), 56 (entry) or 64 px (the form's save) tall. */
  size?: ButtonSize;
}

export function Button({ look = "quiet", size = "control", className = "", type = "button", ...rest }: ButtonProps) {
  return <button type={type} className={`${buttonClass(look, size)} ${className}`} {...rest} />;
}
