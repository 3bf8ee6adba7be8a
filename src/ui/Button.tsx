import type { ButtonHTMLAttributes, ReactNode } from 'react';

interface Props extends Omit<ButtonHTMLAttributes<HTMLButtonElement>, 'className' | 'style'> {
  /** `main` once a screen; `stop` for what cannot be undone; `plain` reads as a link. */
  look?: 'main' | 'quiet' | 'stop' | 'plain';
  children: ReactNode;
}

/** The one button. What only leads somewhere is a link: `<a class="button quiet">`. */
export function Button({ look = 'main', type = 'button', children, ...rest }: Props) {
  return (
    <button type={type} className={look === 'main' ? 'button' : `button ${look}`} {...rest}>
      {children}
    </button>
  );
}
