interface TickProps {
  label: string;
  checked: boolean;
  onChange: (checked: boolean) => void;
  disabled?: boolean;
}

/** A crossed square, as on paper. */
export function Tick({ label, checked, onChange, disabled }: TickProps) {
  return (
    <label className="tick">
      <input
        type="checkbox"
        checked={checked}
        disabled={disabled}
        onChange={(event) => onChange(event.target.checked)}
      />
      <span className="square" aria-hidden="true">
        <svg viewBox="0 0 10 10">
          <path d="M1 1 9 9M9 1 1 9" />
        </svg>
      </span>
      {label}
    </label>
  );
}
