interface ChoiceRowProps<Value extends string> {
  label: string;
  choices: readonly { value: Value; words: string }[];
  columns: 1 | 2;
  value: Value | null;
  onChange: (value: Value) => void;
}

/** One of several, none chosen beforehand. */
export function ChoiceRow<Value extends string>({ label, choices, columns, value, onChange }: ChoiceRowProps<Value>) {
  return (
    <fieldset>
      <legend className="pb-1 t-label text-muted">{label}</legend>
      <div className={`grid gap-2 ${columns === 2 ? "grid-cols-2" : ""}`}>
        {choices.map((choice) => (
          <label
            key={choice.value}
            className={`flex min-h-14 items-center gap-3 rounded-[8px] px-4 text-[16px] font-[620] has-focus-visible:outline-[2.5px] has-focus-visible:outline-accent ${choice.value === value ? "border-[2.5px] border-accent bg-accent-soft" : "control"}`}
          >
            <input
              type="radio"
              name={label}
              value={choice.value}
              checked={choice.value === value}
              onChange={() => onChange(choice.value)}
              className="size-5 accent-accent"
            />
            {choice.words}
          </label>
        ))}
      </div>
    </fieldset>
  );
}
