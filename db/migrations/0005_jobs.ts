import { sql, type Kysely } from 'kysely';

/**
 * The door from a transaction of the application to the job queue: listed tasks only, so the application's role needs
 * no right on the queue's own tables.
 */
export async function up(db: Kysely<unknown>): Promise<void> {
  await sql`
    create function app.enqueue(task text, payload jsonb, job_key text) returns void language plpgsql security definer
      set search_path = pg_catalog, pg_temp
      as $$
      begin
        if task not in ('rejudgeOthers') then
          raise exception 'enqueue requires a listed task, got %', task;
        end if;
        perform graphile_worker.add_job(task, payload::json, job_key => job_key, job_key_mode => 'replace');
      end
      $$`.execute(db);
  await sql`revoke all on function app.enqueue(text, jsonb, text) from public`.execute(db);
  await sql`grant execute on function app.enqueue(text, jsonb, text) to marram_app, marram_job`.execute(db);
}
