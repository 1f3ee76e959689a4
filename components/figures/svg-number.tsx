import type { SVGProps } from "react";

interface SvgNumberProps extends Omit<SVGProps<SVGTextElement>, "children"> {
  text: string;
}

/** A number in the mono face inside an SVG, its decimal point drawn in as <Quantity> does it in HTML. */
export function SvgNumber({ text, className = "", ...rest }: SvgNumberProps) {
  const [whole, decimals] = text.split(".");
  return (
    <text {...rest} className={`nums ${className}`}>
      {whole}
      {decimals !== undefined && <tspan dx="-.13em">.</tspan>}
      {decimals !== undefined && <tspan dx="-.13em">{decimals}</tspan>}
    </text>
  );
}
