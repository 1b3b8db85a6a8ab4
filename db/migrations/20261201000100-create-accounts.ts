import type { QueryInterface } from 'sequelize';

interface Params {
  context: QueryInterface;
}

export async function up({ context: { sequelize } }: Params): Promise<void> {
  await sequelize.transaction(async (transaction) => {
    await sequelize.query(
      `
      create table users (
        id uuid primary key default gen_random_uuid(),
        name text not null check (length(btrim(name)) between 1 and 80),
        email text not null check (length(email) <= 254 and email = lower(btrim(email)) and email like '%_@_%'),
        pending_email text check (length(pending_email) <= 254 and pending_email = lower(btrim(pending_email))),
        password_hash text not null check (password_hash like '$argon2id$%'),
        email_confirmed_at timestamptz,
        token_version integer not null default 1 check (token_version > 0),
        units text not null default 'metric' check (units in ('metric', 'imperial')),
        terms text not null default 'us' check (terms in ('us', 'uk')),
        theme text not null default 'system' check (theme in ('system', 'light', 'dark')),
        currency text not null default 'EUR' check (currency ~ '^[A-Z]{3}$'),
        version integer not null default 1 check (version > 0),
        created_at timestamptz not null default now(),
        updated_at timestamptz not null default now()
      );
      -- One account per address, however it is written; also finds the account at sign-in.
      create unique index users_lower_email on users (lower(email));

      create table user_roles (
        user_id uuid not null references users on delete cascade,
        role text not null check
          (role in ('maker', 'designer', 'seller', 'teacher', 'student', 'administrator')),
        primary key (user_id, role)
      );
      -- Who the administrators are: asked before one is removed.
      create index user_roles_role on user_roles (role);

      create table email_tokens (
        id uuid primary key default gen_random_uuid(),
        user_id uuid not null references users on delete cascade,
        purpose text not null check (purpose in ('confirm', 'reset')),
        token_hash text not null unique check (token_hash ~ '^[0-9a-f]{64}$'),
        email text not null,
        expires_at timestamptz not null,
        used_at timestamptz,
        created_at timestamptz not null default now(),
        check (expires_at > created_at)
      );
      -- A person's letters of one kind: a new one ends those before it.
      create index email_tokens_user on email_tokens (user_id, purpose);

      create table audit_entries (
        id uuid primary key default gen_random_uuid(),
        action text not null check (action in ('roles-set', 'first-administrator')),
        actor_id uuid references users on delete set null,
        actor_name text not null,
        subject_id uuid references users on delete set null,
        subject_name text not null,
        before text[] not null,
        after text[] not null,
        created_at timestamptz not null default now()
      );
      -- The list on the administration page, newest first.
      create index audit_entries_newest on audit_entries (created_at desc, id);
      -- Deleting an account looks its entries up.
      create index audit_entries_actor on audit_entries (actor_id);
      create index audit_entries_subject on audit_entries (subject_id);
      `,
      { transaction },
    );
  });
}

/** Deletes every account: only for an empty or a scratch database. */
export async function down({ context: { sequelize } }: Params): Promise<void> {
  await sequelize.query('drop table audit_entries, email_tokens, user_roles, users');
}
