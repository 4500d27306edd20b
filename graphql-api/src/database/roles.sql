-- Run once per cluster by its superuser, before the first migration. Passwords are set by the caller.
do $$ begin
  -- owns schemas and tables, runs migrations; row level security binds it too (FORCE)
  if not exists (select from pg_roles where rolname = 'app_owner') then create role app_owner login nosuperuser nobypassrls; end if;
  -- the API and the handlers of jobs: owns nothing, bypasses nothing
  if not exists (select from pg_roles where rolname = 'app_api') then create role app_api login nosuperuser nobypassrls noinherit; end if;
  -- graphile-worker's own connection: its queue, no table of ours
  if not exists (select from pg_roles where rolname = 'app_worker') then create role app_worker login nosuperuser nobypassrls; end if;
  -- owns the few functions that must look across organisations; nobody can sign in as it
  if not exists (select from pg_roles where rolname = 'app_login') then create role app_login nologin bypassrls; end if;
end $$;
grant app_login, app_worker to app_owner;
alter role app_api set search_path = metewand;
alter role app_owner set search_path = metewand;
