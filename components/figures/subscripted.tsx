import { Fragment } from "react";

/** Writes SpO2, FiO2, PaO2, PaCO2, EtCO2, HCO3, cmH2O with their lowered digits. For HTML only: never inside an SVG. */
export function Subscripted({ text }: { text: string }) {
  return (
    <>
      {text
        .split(lowered)
        .map((part, index) =>
          index % 2 === 1 ? <sub key={index}>{part}</sub> : <Fragment key={index}>{part}</Fragment>,
        )}
    </>
  );
}

const lowered = /(?<=[a-zC]O|cmH)([23])(?!\d)/;
