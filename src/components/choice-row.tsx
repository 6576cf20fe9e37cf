interface ChoiceRowProps<Id extends string> {
  name: string;
  label: string;
  choices: readonly { id: Id; label: string }[];
  value: Id | '';
  onChange: (id: Id) => void;
  disabled?: boolean;
  /** Marks the chosen word as a field of a table, so that Enter and the arrows pass through it. */
  inTable?: boolean;
  describedBy?: string;
}

/** Words, the chosen one boxed; arrows change it, as in any group of radio buttons. */
export function ChoiceRow<Id extends string>(props: ChoiceRowProps<Id>) {
  const { name, label, choices, value, onChange, disabled, inTable, describedBy } = props;
  const stop = choices.some(({ id }) => id === value) ? value : choices[0]?.id;
  return (
    <div className="choices" role="radiogroup" aria-label={label} aria-describedby={describedBy}>
      {choices.map((choice) => (
        <label key={choice.id} className="choice">
          <input
            type="radio"
            name={name}
            value={choice.id}
            checked={choice.id === value}
            disabled={disabled}
            onChange={() => onChange(choice.id)}
            {...(inTable && choice.id === stop ? { 'data-field': '' } : {})}
          />
          <span>{choice.label}</span>
        </label>
      ))}
    </div>
  );
}
