import type { InputHTMLAttributes, ReactNode } from 'react';
import { useId } from 'react';

interface FieldProps extends InputHTMLAttributes<HTMLInputElement> {
  label: string;
  /** The sentence under a wrong field. */
  wrong?: string;
  hint?: ReactNode;
}

/** One labelled field; what is wrong with it is read out with it. */
export function Field({ label, wrong, hint, id, className, ...input }: FieldProps) {
  const made = useId();
  const field = id ?? made;
  const under = wrong ?? hint;
  return (
    <div className={`field ${className ?? ''}`} data-wrong={wrong ? '' : undefined}>
      <label htmlFor={field}>{label}</label>
      <input
        {...input}
        id={field}
        aria-invalid={wrong ? true : undefined}
        aria-describedby={under ? `${field}-under` : undefined}
      />
      {under && (
        <p id={`${field}-under`} className={wrong ? 'wrong' : 'hint'}>
          {under}
        </p>
      )}
    </div>
  );
}
