-- Every table is guarded: this must return no row. $1 is the API role, $2 the login role, $3 the queue's role.
with parameter as (select $1::text as api, $2::text as login, $3::text as queue),
t as (
  select c.oid, n.nspname as schema, c.relname as name, c.relrowsecurity, c.relforcerowsecurity, c.relowner,
         a.attnum, a.attnotnull
  from pg_class c
  join pg_namespace n on n.oid = c.relnamespace
  left join pg_attribute a on a.attrelid = c.oid and not a.attisdropped
    and a.attname = case when c.relname = 'organisation' then 'id' else 'organisation_id' end
  where n.nspname in ('metewand', 'identity', 'jobs') and c.relkind in ('r', 'p') and c.relname <> 'migrations'
),
-- people and sessions belong to no organisation; the API role must have no right on them at all
tenant as (select * from t where schema <> 'identity')
select 'no organisation_id column' as fault, name as what from tenant where attnum is null
union all select 'organisation_id nullable', name from tenant where not attnotnull
union all select 'row level security not enabled and forced', name from tenant where not (relrowsecurity and relforcerowsecurity)
union all select 'no policy', name from tenant where not exists (select from pg_policy p where p.polrelid = tenant.oid)
union all select 'more than one permissive policy', name from tenant
  where (select count(*) from pg_policy p where p.polrelid = tenant.oid and p.polpermissive) > 1
union all select 'policy without the context as an init plan', name || '.' || p.polname
  from tenant join pg_policy p on p.polrelid = tenant.oid
  where pg_get_expr(p.polqual, p.polrelid) !~ 'SELECT .*current_organisation_id\(\)'
union all select 'policy allows writes without check', name || '.' || p.polname
  from tenant join pg_policy p on p.polrelid = tenant.oid
  where p.polcmd in ('*', 'a', 'w') and p.polwithcheck is null
union all select 'foreign key without organisation_id', x.conname
  from pg_constraint x join tenant on tenant.oid = x.conrelid join tenant r on r.oid = x.confrelid
  where x.contype = 'f' and not tenant.attnum = any (x.conkey)
union all select 'unique index without organisation_id', i.indexrelid::regclass::text
  from pg_index i join tenant on tenant.oid = i.indrelid
  where i.indisunique and not tenant.attnum = any (i.indkey::int2[])
union all select 'index that does not begin with organisation_id', i.indexrelid::regclass::text
  from pg_index i join tenant on tenant.oid = i.indrelid where i.indkey[0] <> tenant.attnum
union all select 'API role has a right on an identity table', name
  from t, parameter where schema = 'identity'
    and has_table_privilege(api, t.oid, 'SELECT, INSERT, UPDATE, DELETE, TRUNCATE, REFERENCES, TRIGGER')
union all select 'API role may write the audit trail', name
  from tenant, parameter where name in ('audit_entry', 'audit_head')
    and has_table_privilege(api, tenant.oid, 'INSERT, UPDATE, DELETE')
union all select 'API or queue role owns a table', name
  from t join pg_roles r on r.oid = t.relowner, parameter where r.rolname in (api, queue, login)
union all select 'role is super, bypasses or creates roles', rolname
  from pg_roles, parameter where rolname in (api, queue) and (rolsuper or rolbypassrls or rolcreaterole)
union all select 'login role can sign in', rolname from pg_roles, parameter where rolname = login and rolcanlogin
union all select 'API role is a member of a role', r.rolname
  from pg_roles r, parameter where r.rolname <> api and pg_has_role(api, r.oid, 'member')
union all select 'truncate, references or trigger granted to the API role', name
  from t, parameter where has_table_privilege(api, t.oid, 'TRUNCATE, REFERENCES, TRIGGER')
union all select 'queue role has a right on our tables', name
  from t, parameter where has_table_privilege(queue, t.oid, 'SELECT, INSERT, UPDATE, DELETE')
union all select 'API role reaches the queue', c.relname
  from pg_class c join pg_namespace n on n.oid = c.relnamespace, parameter
  where n.nspname = 'graphile_worker' and c.relkind in ('r', 'p')
    and has_table_privilege(api, c.oid, 'SELECT, INSERT, UPDATE, DELETE')
union all select 'view without security_invoker', c.relname
  from pg_class c join pg_namespace n on n.oid = c.relnamespace
  where n.nspname in ('metewand', 'identity', 'jobs') and c.relkind = 'v'
    and not coalesce(c.reloptions && array['security_invoker=true', 'security_invoker=on'], false)
union all select 'materialised view readable by the API role', c.relname
  from pg_class c join pg_namespace n on n.oid = c.relnamespace, parameter
  where n.nspname in ('metewand', 'identity', 'jobs') and c.relkind = 'm' and has_table_privilege(api, c.oid, 'SELECT')
union all select 'definer function outside the allow-list or without search_path', n.nspname || '.' || p.proname
  from pg_proc p join pg_namespace n on n.oid = p.pronamespace
  where n.nspname in ('metewand', 'identity', 'jobs') and p.prosecdef
    and (p.proconfig is null or n.nspname || '.' || p.proname not in (
      'metewand.audit_append', 'identity.find_user', 'identity.memberships_of', 'identity.open_session',
      'identity.rotate_session', 'identity.switch_session', 'identity.end_session', 'identity.caller',
      'jobs.enqueue', 'jobs.call_to_run', 'jobs.lost_runs'))
union all select 'function that anybody may call', n.nspname || '.' || p.proname
  from pg_proc p join pg_namespace n on n.oid = p.pronamespace
  where n.nspname in ('metewand', 'identity', 'jobs') and has_function_privilege('public', p.oid, 'EXECUTE')
union all select 'sequence readable by the API role', c.relname
  from pg_class c join pg_namespace n on n.oid = c.relnamespace, parameter
  where n.nspname in ('metewand', 'identity', 'jobs') and c.relkind = 'S' and has_sequence_privilege(api, c.oid, 'SELECT')
