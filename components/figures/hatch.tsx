/** The pattern of what is not measured. Drawn, not a CSS gradient, so that it prints. Refer to it by `url(#id)`. */
export function HatchPattern({ id }: { id: string }) {
  return (
    <pattern id={id} width="7" height="7" patternUnits="userSpaceOnUse" patternTransform="rotate(45)">
      <rect width="7" height="7" fill="var(--unm-soft)" />
      <path d="M0 0V7" stroke="var(--unm)" strokeOpacity=".55" strokeWidth="1.6" />
    </pattern>
  );
}
