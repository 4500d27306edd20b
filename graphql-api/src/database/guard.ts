/**
 * SQL that closes a tenant table: row level security for everybody, the owner included, one policy, and
 * no more rights for the API role than `privileges`. Stands in the same migration as the table.
 */
export function guard(
  table: string,
  privileges = 'select, insert, update, delete',
  column = 'organisation_id',
) {
  const own = `${column} = (select metewand.current_organisation_id())`;
  return `
    alter table metewand.${table} enable row level security;
    alter table metewand.${table} force row level security;
    create policy organisation on metewand.${table} using (${own}) with check (${own});
    grant ${privileges} on metewand.${table} to app_api;`;
}

/** A foreign key added to a guarded table is checked under its policy, which needs a context; the table is empty. */
export const NO_ORGANISATION = `select set_config('app.organisation_id', '00000000-0000-0000-0000-000000000000', true);`;
