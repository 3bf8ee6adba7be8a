/**
 * Row policies, spelled once and used by the migrations. Frozen text: a later rule is a new function in a new
 * migration, since a shipped migration never changes.
 */
const VIEWERS_ACADEMY = `academy_id = (select app.academy_id())`;
const VISIBLE = `athlete_id in (select app.visible_athletes())`;

const list = (roles: readonly string[]) => roles.map((role) => `'${role}'`).join(', ');

/** Closes a table (enable and force), and lets jobs reach the rows of the academy they work for. */
export function closed(table: string, jobs: 'all' | 'none' = 'all'): string {
  return `
    alter table ${table} enable row level security;
    alter table ${table} force row level security;
    ${
      jobs === 'all'
        ? `create policy ${table}_job on ${table} for all to marram_job
             using (${VIEWERS_ACADEMY}) with check (${VIEWERS_ACADEMY});
           grant select, insert, update, delete on ${table} to marram_job;`
        : ''
    }`;
}

interface AthleteTable {
  /** Roles that may read the rows of the athletes they see. */
  readers: readonly string[];
  /** Roles that may add and change them. */
  writers: readonly string[];
  /** Whether the application may delete rows (links only: measurements are voided, never deleted). */
  deletes?: boolean;
}

/** A table about athletes: read and written by scope (own, child, squad, academy) and by role. */
export function aboutAthletes(table: string, { readers, writers, deletes = false }: AthleteTable): string {
  const write = `${VIEWERS_ACADEMY} and (select app.acts_as(${list(writers)})) and ${VISIBLE}`;
  return `
    ${closed(table)}
    create policy ${table}_read on ${table} for select to marram_app
      using (${VIEWERS_ACADEMY} and (select app.acts_as(${list(readers)})) and ${VISIBLE});
    create policy ${table}_add on ${table} for insert to marram_app with check (${write});
    create policy ${table}_change on ${table} for update to marram_app using (${write}) with check (${write});
    grant select, insert, update on ${table} to marram_app;
    ${
      deletes
        ? `create policy ${table}_drop on ${table} for delete to marram_app using (${write});
           grant delete on ${table} to marram_app;`
        : ''
    }`;
}

/** A table of the programme (no athlete in it): read by some roles of the academy, written by others. */
export function aboutProgramme(
  table: string,
  { readers, writers }: { readers: readonly string[]; writers: readonly string[] },
): string {
  const write = `${VIEWERS_ACADEMY} and (select app.acts_as(${list(writers)}))`;
  return `
    ${closed(table)}
    create policy ${table}_read on ${table} for select to marram_app
      using (${VIEWERS_ACADEMY} and (select app.acts_as(${list(readers)})));
    create policy ${table}_add on ${table} for insert to marram_app with check (${write});
    create policy ${table}_change on ${table} for update to marram_app using (${write}) with check (${write});
    grant select, insert, update on ${table} to marram_app;`;
}

export const STAFF = ['director', 'strength_coach', 'swing_coach'] as const;
export const EVERYONE = [...STAFF, 'guardian', 'athlete'] as const;
