export type ButtonLook = "primary" | "quiet" | "dashed";
export type ButtonSize = "control" | "bar" | "entry" | "save" | "door";

const looks: Record<ButtonLook, string> = {
  primary: "bg-accent text-on-accent border-[1.5px] border-accent",
  quiet: "control",
  dashed: "border-2 border-dashed border-rule bg-transparent text-muted",
};

const sizes: Record<ButtonSize, string> = {
  control: "min-h-11 px-4 text-[15px] rounded-[6px]",
  bar: "min-h-12 px-4 text-[15px] rounded-[6px]",
  entry: "min-h-14 px-4 text-[16px] rounded-[8px]",
  save: "min-h-16 px-6 text-[18px] rounded-[10px]",
  door: "min-h-14 px-6 text-[18px] rounded-[6px] desk:min-h-16",
};

/** For what looks like a button and is a link. */
export function buttonClass(look: ButtonLook = "quiet", size: ButtonSize = "control"): string {
  return `inline-flex items-center justify-center gap-2 font-words font-[640] leading-tight text-center disabled:opacity-55 ${looks[look]} ${sizes[size]}`;
}
