/** Whether PostgreSQL refused a row because there is one of its key. */
export const isUniqueViolation = (error: unknown): boolean =>
  error instanceof Error && (error as { code?: unknown }).code === '23505';
