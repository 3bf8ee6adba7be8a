import type { ComponentPropsWithRef, ReactNode } from 'react';

interface Common {
  label: string;
  /** Also the id, and so the place that an error summary links to, unless `id` says otherwise. */
  name: string;
  id?: string;
  /** A line under the label: what to enter, an example. Never a placeholder. */
  hint?: ReactNode;
  /** What is wrong, in words that say how to put it right. */
  error?: string | undefined;
  /** Stands beside the control and is read with it. */
  unit?: string;
  /** Everything else is required, so only this is marked. */
  optional?: boolean;
}

type Own = keyof Common | 'className' | 'style' | 'placeholder';

export type FieldProps = Common &
  (
    | ({ kind?: 'text' } & Omit<ComponentPropsWithRef<'input'>, Own>)
    | ({ kind: 'number' } & Omit<ComponentPropsWithRef<'input'>, Own | 'type' | 'inputMode'>)
    | ({ kind: 'long' } & Omit<ComponentPropsWithRef<'textarea'>, Own>)
    | ({ kind: 'choice'; options: readonly { value: string; label: string }[] } & Omit<
        ComponentPropsWithRef<'select'>,
        Own
      >)
  );

/**
 * A label, its hint, its error and its control, wired for every reader. Works as plain HTML, and takes what
 * react-hook-form's `register` gives. A number is text with a decimal keypad: no wheel can change it, and `,` and `.`
 * can both be typed.
 */
export function Field({ label, name, id = name, hint, error, unit, optional = false, ...control }: FieldProps) {
  const ids = { hint: `${id}-hint`, error: `${id}-error`, unit: `${id}-unit` };
  const described = [hint && ids.hint, error && ids.error, unit && ids.unit].filter(Boolean).join(' ');
  const wiring: Wiring = {
    id,
    name,
    'aria-describedby': described || undefined,
    'aria-invalid': error ? true : undefined,
    required: !optional,
  };
  return (
    <div className={error ? 'field wrong' : 'field'}>
      <label htmlFor={id}>
        {label}
        {optional && <span className="optional"> (optional)</span>}
      </label>
      {hint && (
        <p className="hint" id={ids.hint}>
          {hint}
        </p>
      )}
      {error && (
        <p className="error" id={ids.error}>
          <span className="sr-only">Error: </span>
          {error}
        </p>
      )}
      <div className="control">
        {controlOf(control, wiring)}
        {unit && (
          <span className="unit" id={ids.unit}>
            {unit}
          </span>
        )}
      </div>
    </div>
  );
}

interface Wiring {
  id: string;
  name: string;
  'aria-describedby': string | undefined;
  'aria-invalid': true | undefined;
  required: boolean;
}

type ControlProps = FieldProps extends infer F ? (F extends Common ? Omit<F, keyof Common> : never) : never;

function controlOf(control: ControlProps, wiring: Wiring): ReactNode {
  switch (control.kind) {
    case 'long': {
      const { kind, ...rest } = control;
      return <textarea {...rest} {...wiring} className="input" />;
    }
    case 'choice': {
      const { kind, options, ...rest } = control;
      return (
        <select {...rest} {...wiring} className="input">
          {options.map(({ value, label }) => (
            <option key={value} value={value}>
              {label}
            </option>
          ))}
        </select>
      );
    }
    case 'number': {
      const { kind, ...rest } = control;
      return <input autoComplete="off" {...rest} {...wiring} type="text" inputMode="decimal" className="input short" />;
    }
    default: {
      const { kind, ...rest } = control;
      return <input type="text" {...rest} {...wiring} className="input" />;
    }
  }
}
