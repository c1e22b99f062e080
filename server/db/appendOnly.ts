/** Triggers that make a table append-only: what is written is neither changed nor removed. */
export function appendOnly(table: string): string {
  return `create trigger ${table}_no_update before update on ${table} begin select raise(abort, '${table}: append-only'); end;
create trigger ${table}_no_delete before delete on ${table} begin select raise(abort, '${table}: append-only'); end;`
}
