import { Fragment } from "react";

/** A number in the mono face, its decimal point drawn in. Takes text, so that rounding stays with the caller. */
export function Quantity({ text, className = "" }: { text: string; className?: string }) {
  const [whole, ...decimals] = text.split(".");
  return (
    <span className={`nums ${className}`}>
      {whole}
      {decimals.map((part, index) => (
        <Fragment key={index}>
          <i className="d">.</i>
          {part}
        </Fragment>
      ))}
    </span>
  );
}
