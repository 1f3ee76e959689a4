import { useId, type ComponentProps } from "react";

export interface TextFieldProps extends Omit<ComponentProps<"input">, "id"> {
  label: string;
  /** What is accepted, below the field. */
  hint?: string;
  /** Why it was refused: a whole sentence. */
  error?: string;
}

/** A labelled field, 60 px tall. Takes a `ref` and the props of react-hook-form's `register`. */
export function TextField({ label, hint, error, className = "", ...input }: TextFieldProps) {
  const id = useId();
  const said = [error && `${id}-error`, hint && `${id}-hint`].filter(Boolean).join(" ");
  return (
    <div className={className}>
      <label htmlFor={id} className="mb-1 block t-label text-muted">
        {label}
      </label>
      <input
        id={id}
        aria-invalid={error ? true : undefined}
        aria-describedby={said || undefined}
        className={`h-15 w-full rounded-[6px] border-[1.5px] bg-paper px-4 text-[18px] text-ink ${error ? "border-outside" : "border-rule"}`}
        {...input}
      />
      {hint && (
        <p id={`${id}-hint`} className="mt-1 t-label text-muted">
          {hint}
        </p>
      )}
      {error && (
        <p id={`${id}-error`} className="mt-1 t-small font-[560] text-outside">
          {error}
        </p>
      )}
    </div>
  );
}
