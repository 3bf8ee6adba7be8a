import type { UseFormRegister } from 'react-hook-form';
import { controlName, type FormField } from '#src/schemas/method/form/formField.ts';
import { Field } from '#src/ui/Field.tsx';

interface Props {
  field: FormField;
  register: UseFormRegister<Record<string, string>>;
  error: string | undefined;
  /** What stands in it at first, before any script runs too. */
  text: string;
}

const YES_OR_NO = [
  { value: 'yes', label: 'Yes' },
  { value: 'no', label: 'No' },
];

/** The control of one field: a line, some lines, or a choice. */
export function CalculatorField({ field, register, error, text }: Props) {
  const { label, hint, unit, optional } = field;
  const name = controlName(field);
  const common = {
    ...register(name),
    label,
    name,
    error,
    defaultValue: text,
    ...(hint ? { hint } : {}),
    ...(unit ? { unit } : {}),
    ...(optional ? { optional } : {}),
  };
  switch (field.kind) {
    case 'number':
      return <Field kind="number" {...common} />;
    case 'flag':
      return <Field kind="choice" options={withNone(YES_OR_NO, field)} {...common} />;
    case 'choice':
      return <Field kind="choice" options={withNone(field.options, field)} {...common} />;
    case 'rows':
      if (field.oneLine) return <Field {...common} autoComplete="off" />;
      return <Field kind="long" rows={6} spellCheck={false} {...common} />;
    case 'table':
      return <Field kind="long" rows={6} spellCheck={false} {...common} />;
    case 'numbers':
      return <Field kind="long" rows={2} spellCheck={false} {...common} />;
    case 'samples':
      return <Field kind="long" rows={3} spellCheck={false} {...common} />;
    default:
      return <Field {...common} />;
  }
}

const withNone = (options: readonly { value: string; label: string }[], { optional }: FormField) =>
  optional ? [{ value: '', label: 'Not given' }, ...options] : options;
