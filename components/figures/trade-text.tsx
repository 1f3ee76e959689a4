import { DeltaP } from "./delta";
import { Subscripted } from "./subscripted";

/** Words of the trade as they are set: lowered digits (SpO2, cmH2O) and a drawn Δ in 'ΔP'. For HTML only. */
export function TradeText({ text }: { text: string }) {
  const [before = "", ...after] = text.split("ΔP");
  return (
    <>
      <Subscripted text={before} />
      {after.map((part, index) => (
        <span key={index}>
          <DeltaP />
          <Subscripted text={part} />
        </span>
      ))}
    </>
  );
}
