import type { ButtonHTMLAttributes } from 'react';
import { Link, type LinkProps } from 'react-router-dom';

interface Look {
  /** `go` is the one main act, `stop` what sends back or ends, `plain` the rest. */
  look?: 'plain' | 'go' | 'stop';
  size?: 'dense' | 'standard' | 'tall';
}

function classes({ look = 'plain', size = 'standard' }: Look, more = ''): string {
  return `button ${look} ${size} ${more}`.trim();
}

export function Button({
  look,
  size,
  pressed,
  className,
  ...rest
}: Look & { pressed?: boolean } & ButtonHTMLAttributes<HTMLButtonElement>) {
  return (
    <button
      type="button"
      {...rest}
      {...(pressed === undefined ? {} : { 'aria-pressed': pressed })}
      className={classes({ look, size }, className)}
    />
  );
}

/** A link that stands among buttons and looks like one. */
export function ButtonLink({ look, size, className, ...rest }: Look & LinkProps) {
  return <Link {...rest} className={classes({ look, size }, className)} />;
}
