import { useEffect, useState } from 'react';
import { useForm } from 'react-hook-form';
import { callCalculator } from '#src/client/method/callCalculator.ts';
import { loadSchema } from '#src/client/method/loadSchema.ts';
import type { CalculatorName } from '#src/schemas/method/calculatorNames.ts';
import { bodyOf } from '#src/schemas/method/form/bodyOf.ts';
import { controlName, type FormField, type FormTexts } from '#src/schemas/method/form/formField.ts';
import { placeErrors, type PlacedError } from '#src/schemas/method/form/placeErrors.ts';

/** What was asked and what came of it. */
export interface Outcome {
  request: unknown;
  answer: object;
}

/** The form's state as the server drew it. */
export interface Start {
  texts: FormTexts;
  errors: readonly PlacedError[];
  outcome: Outcome | null;
}

/**
 * A calculator's form: texts by control, checked with the route's own schema before it is asked, and with what the
 * route itself has to say after.
 */
export function useCalculator(name: CalculatorName, fields: readonly FormField[], start: Start) {
  const [outcome, setOutcome] = useState<Outcome | null>(start.outcome);
  const [errors, setErrors] = useState<readonly PlacedError[]>(start.errors);
  /** Until the script runs, the browser's own checks and a plain GET do the work. */
  const [enhanced, setEnhanced] = useState(false);
  useEffect(() => setEnhanced(true), []);

  const form = useForm<Record<string, string>>({
    defaultValues: Object.fromEntries(fields.map((field) => [controlName(field), start.texts[field.path] ?? ''])),
    shouldFocusError: false,
  });

  const submit = form.handleSubmit(async (values) => {
    const texts = Object.fromEntries(fields.map((field) => [field.path, values[controlName(field)] ?? '']));
    const body = bodyOf(fields, texts);
    const checked = (await loadSchema(name)).safeParse(body);
    const found = checked.success
      ? await callCalculator(name, body)
      : {
          answer: null,
          errors: checked.error.issues.slice(0, 100).map((issue) => ({
            path: issue.path.join('.'),
            message: issue.code === 'unrecognized_keys' ? 'There is more on a line than asked for' : issue.message,
          })),
        };
    setErrors(found.errors ? placeErrors(fields, found.errors) : []);
    setOutcome(found.answer ? { request: body, answer: found.answer } : null);
  });

  return { form, submit, outcome, errors, enhanced, busy: form.formState.isSubmitting };
}
