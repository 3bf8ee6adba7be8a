import { useEffect, useRef, type ReactNode } from 'react';
import { CalculatorField } from '#src/islands/method/CalculatorField.tsx';
import { CalculatorOutcome } from '#src/islands/method/CalculatorOutcome.tsx';
import { SampleFile } from '#src/islands/method/SampleFile.tsx';
import { useCalculator, type Start } from '#src/islands/method/useCalculator.ts';
import type { CalculatorName } from '#src/schemas/method/calculatorNames.ts';
import { controlName, type FormField } from '#src/schemas/method/form/formField.ts';
import { Button } from '#src/ui/Button.tsx';
import { ErrorSummary } from '#src/ui/ErrorSummary.tsx';

interface Props {
  name: CalculatorName;
  fields: readonly FormField[];
  /** Names of the answer's figures by path. */
  labels: Readonly<Record<string, string>>;
  start: Start;
}

/** The calculator of a Method page. Without scripts it is a plain form whose page comes back with the figures. */
export function Calculator({ name, fields, labels, start }: Props) {
  const { form, submit, outcome, errors, enhanced, busy } = useCalculator(name, fields, start);
  const summary = useRef<HTMLDivElement>(null);
  const result = useRef<HTMLElement>(null);
  const tries = form.formState.submitCount;
  useEffect(() => {
    if (tries > 0 && !busy) (errors.length > 0 ? summary : result).current?.focus();
  }, [tries, busy, errors]);

  const errorOf = ({ path }: FormField) => errors.find((error) => error.path === path)?.message;
  const rate = fields.find(({ path }) => path === 'sampleRate');
  const sampled = fields.filter(({ kind }) => kind === 'samples');
  return (
    <>
      <form
        method="get"
        action={`/method/${name}#calculator`}
        noValidate={enhanced}
        aria-busy={busy}
        onSubmit={(event) => void submit(event)}
      >
        <ErrorSummary
          ref={summary}
          errors={errors.map(({ path, message }) =>
            path === null
              ? { message }
              : { field: controlName({ path }), message: `${labelOf(fields, path)}: ${message}` },
          )}
        />
        {enhanced && sampled.length > 0 && (
          <SampleFile
            fields={sampled}
            onSamples={(field, samples) => form.setValue(controlName(field), samples.join(' '))}
            onRate={(sampleRate) => rate && form.setValue(controlName(rate), String(sampleRate))}
          />
        )}
        {sectionsOf(fields).map(({ title, members }) => (
          <Section
            key={title ?? ''}
            title={title}
            isOpen={members.some((field) => !field.optional || start.texts[field.path] || errorOf(field))}
          >
            {members.map((field) => (
              <CalculatorField
                key={field.path}
                field={field}
                register={form.register}
                error={errorOf(field)}
                text={start.texts[field.path] ?? ''}
              />
            ))}
          </Section>
        ))}
        <div className="buttons">
          <Button type="submit">{busy ? 'Working it out …' : 'Work it out'}</Button>
        </div>
      </form>
      <section ref={result} tabIndex={-1} className="outcome" aria-label="Result" aria-live="polite">
        {outcome && <CalculatorOutcome name={name} labels={labels} outcome={outcome} />}
      </section>
    </>
  );
}

function Section({ title, isOpen, children }: { title: string | null; isOpen: boolean; children: ReactNode }) {
  if (title === null) return <div className="calculator-fields">{children}</div>;
  return (
    <details className="more" open={isOpen}>
      <summary>{title}</summary>
      <div className="calculator-fields">{children}</div>
    </details>
  );
}

/** Fields in their order, parted where the section changes. */
function sectionsOf(fields: readonly FormField[]): { title: string | null; members: FormField[] }[] {
  const sections: { title: string | null; members: FormField[] }[] = [];
  for (const field of fields) {
    const title = field.section ?? null;
    const last = sections.at(-1);
    if (last && last.title === title) last.members.push(field);
    else sections.push({ title, members: [field] });
  }
  return sections;
}

const labelOf = (fields: readonly FormField[], path: string): string =>
  fields.find((field) => field.path === path)?.label ?? path;
