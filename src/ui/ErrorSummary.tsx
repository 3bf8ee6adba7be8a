import type { Ref } from 'react';

interface Props {
  /** `field` is the id of the control that the message is about; without it the message stands alone. */
  errors: readonly { field?: string; message: string }[];
  title?: string;
  ref?: Ref<HTMLDivElement>;
}

/**
 * What is wrong with a form, above it, each line a link to its field. `autofocus` moves the reader here when the page
 * comes back from the server; an island focuses it through `ref`.
 */
export function ErrorSummary({ errors, title = 'Please check what you entered', ref }: Props) {
  if (errors.length === 0) return null;
  return (
    <div className="error-summary" role="alert" tabIndex={-1} autoFocus ref={ref}>
      <h2>{title}</h2>
      <ul>
        {errors.map(({ field, message }) => (
          <li key={`${field ?? ''} ${message}`}>{field ? <a href={`#${field}`}>{message}</a> : message}</li>
        ))}
      </ul>
    </div>
  );
}
