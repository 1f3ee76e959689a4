export interface DemoPerson {
  role: string;
  email: string;
}

interface DemoPeopleProps {
  people: readonly DemoPerson[];
  /** E-mail of the one now in the form. */
  filled: string;
  onFill: (person: DemoPerson) => void;
}

/** The demo's invented people; one tap fills the form. */
export function DemoPeople({ people, filled, onFill }: DemoPeopleProps) {
  return (
    <section aria-labelledby="demo-people" className="mt-4 desk:mt-6">
      <h2 id="demo-people" className="border-b border-hair pb-1.5 t-head">
        Demo people <span className="ml-1 t-label text-muted">one tap fills the form</span>
      </h2>
      <ul>
        {people.map((person) => (
          <li key={person.email} className="rule-row">
            <button
              type="button"
              onClick={() => onFill(person)}
              className="flex min-h-11 w-full items-center justify-between gap-3 text-left text-[16px]"
            >
              <span className={person.email === filled ? "font-[640]" : ""}>{person.role}</span>
              {person.email === filled ? (
                <span className="text-[15px] font-[640] text-accent">filled in</span>
              ) : (
                <span className="t-label text-muted">{person.email}</span>
              )}
            </button>
          </li>
        ))}
      </ul>
    </section>
  );
}
