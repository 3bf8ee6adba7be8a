import { useState, type ChangeEvent } from 'react';
import { readColumns, type FileColumns } from '#src/client/method/readColumns.ts';
import type { FormField } from '#src/schemas/method/form/formField.ts';
import { Field } from '#src/ui/Field.tsx';

interface Props {
  /** The fields that take samples. */
  fields: readonly FormField[];
  onSamples: (field: FormField, samples: readonly number[]) => void;
  onRate: (sampleRate: number) => void;
}

const MOST_BYTES = 12 * 1024 * 1024;
const LIKELY: Readonly<Record<string, RegExp>> = {
  force: /force|fz|vertical|newton|\bN\b/i,
  lead: /lead/i,
  trail: /trail/i,
};

/** Takes samples from a file: reads it here, on this machine, and lets the person say which column is which. */
export function SampleFile({ fields, onSamples, onRate }: Props) {
  const [file, setFile] = useState<FileColumns | null>(null);
  const [chosen, setChosen] = useState<Readonly<Record<string, number>>>({});
  const [message, setMessage] = useState<{ text: string; wrong: boolean } | null>(null);

  const choose = (read: FileColumns, field: FormField, column: number) => {
    setChosen((before) => ({ ...before, [field.path]: column }));
    onSamples(field, read.columns[column] ?? []);
  };

  const onFile = async ({ target }: ChangeEvent<HTMLInputElement>) => {
    const picked = target.files?.[0];
    if (!picked) return;
    try {
      if (picked.size > MOST_BYTES) throw new RangeError('The file is over 12 MB: cut it to the one trial');
      const read = readColumns(await picked.text());
      if (read.columns.length < fields.length) {
        throw new RangeError(`The file has ${read.columns.length} columns of samples, ${fields.length} are needed`);
      }
      setFile(read);
      fields.forEach((field, i) => choose(read, field, likelyColumn(read, field, i)));
      if (read.sampleRate !== null) onRate(read.sampleRate);
      const rate = read.sampleRate === null ? 'say how many a second' : `${read.sampleRate} a second`;
      setMessage({ text: `${picked.name}: ${read.columns[0]!.length} samples, ${rate}.`, wrong: false });
    } catch (error) {
      setFile(null);
      const text = error instanceof RangeError ? error.message : 'The file could not be read';
      setMessage({ text: `${picked.name}: ${text}.`, wrong: true });
    }
  };

  return (
    <div className="sample-file">
      <Field
        label="Take the samples from a file"
        name="sample-file"
        type="file"
        accept=".csv,.txt,.tsv,text/csv,text/plain"
        hint="A table of samples, with or without a time column. It is read here; only the samples are sent."
        error={message?.wrong ? message.text : undefined}
        optional
        onChange={onFile}
      />
      <p role="status" className="small soft">
        {message?.wrong === false ? message.text : ''}
      </p>
      {file &&
        file.columns.length > 1 &&
        fields.map((field) => (
          <Field
            key={field.path}
            kind="choice"
            label={`Column of: ${field.label.toLowerCase()}`}
            name={`column-${field.path}`}
            value={String(chosen[field.path] ?? 0)}
            options={file.names.map((label, i) => ({ value: String(i), label }))}
            onChange={({ target }) => choose(file, field, Number(target.value))}
          />
        ))}
    </div>
  );
}

function likelyColumn({ names, columns }: FileColumns, { path }: FormField, position: number): number {
  const named = names.findIndex((name) => LIKELY[path]?.test(name));
  return named === -1 ? Math.min(position, columns.length - 1) : named;
}
