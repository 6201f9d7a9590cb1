import type { Knex } from 'knex';

import { createLookupFunction } from './tables/lookup-function';

export async function up(knex: Knex): Promise<void> {
  await createSignIn(knex);
  await createSession(knex);
  await createReset(knex);
  await createInvitation(knex);
}

async function createSignIn(knex: Knex): Promise<void> {
  await createLookupFunction(
    knex,
    'find_sign_in(p_email text)',
    'table (person_id uuid, name text, password_hash text, shop_id uuid, shop_name text, role text)',
    `begin
       return query
         select p.id, p.name, p.password_hash, s.id, s.name, m.role
         from people p
         left join memberships m on m.person_id = p.id and m.left_at is null
         left join shops s on s.id = m.shop_id
         where p.email = lower(p_email)
         order by m.created_at, s.id;
     end`,
  );
  await createLookupFunction(
    knex,
    `open_session(p_person_id uuid, p_shop_id uuid, p_family uuid, p_token_hash bytea, p_expires_at timestamptz)`,
    'void',
    `begin
       insert into sign_ins (person_id, shop_id, purpose, family, token_hash, expires_at)
       values (p_person_id, p_shop_id, 'session', p_family, p_token_hash, p_expires_at);
     end`,
  );
}

async function createSession(knex: Knex): Promise<void> {
  // A token that was exchanged longer ago than the grace is a copy: everything that follows from its sign-in ends. Within
  // the grace it is a second tab, or an answer lost on a weak signal, and gets a next token of its own.
  await createLookupFunction(
    knex,
    `rotate_session(p_token_hash bytea, p_next_hash bytea, p_expires_at timestamptz, p_grace interval)`,
    'table (outcome text, person_id uuid, shop_id uuid, role text, family uuid)',
    `declare
       found_sign_in sign_ins%rowtype;
       current_role_of text;
     begin
       select * into found_sign_in from sign_ins
         where token_hash = p_token_hash and purpose = 'session' for update;
       if not found then
         return query select 'unknown'::text, null::uuid, null::uuid, null::text, null::uuid;
         return;
       end if;
       if found_sign_in.used_at < now() - p_grace and found_sign_in.revoked_at is null then
         update sign_ins set revoked_at = now()
           where sign_ins.family = found_sign_in.family and sign_ins.revoked_at is null;
         return query select 'reused'::text, found_sign_in.person_id, found_sign_in.shop_id, null::text, found_sign_in.family;
         return;
       end if;
       select m.role into current_role_of from memberships m
         where m.person_id = found_sign_in.person_id and m.shop_id = found_sign_in.shop_id and m.left_at is null;
       if current_role_of is null or found_sign_in.revoked_at is not null or found_sign_in.expires_at <= now() then
         return query select 'ended'::text, found_sign_in.person_id, found_sign_in.shop_id, null::text, found_sign_in.family;
         return;
       end if;
       update sign_ins set used_at = coalesce(used_at, now()) where sign_ins.id = found_sign_in.id;
       insert into sign_ins (person_id, shop_id, purpose, family, token_hash, expires_at)
         values (found_sign_in.person_id, found_sign_in.shop_id, 'session', found_sign_in.family, p_next_hash, p_expires_at);
       return query
         select 'rotated'::text, found_sign_in.person_id, found_sign_in.shop_id, current_role_of, found_sign_in.family;
     end`,
  );
  await createLookupFunction(
    knex,
    'close_session(p_token_hash bytea)',
    'void',
    `begin
       update sign_ins set revoked_at = now()
         where revoked_at is null and purpose = 'session'
           and family = (select s.family from sign_ins s where s.token_hash = p_token_hash and s.purpose = 'session');
     end`,
  );
}

async function createReset(knex: Knex): Promise<void> {
  await createLookupFunction(
    knex,
    'open_reset(p_email text, p_token_hash bytea, p_expires_at timestamptz)',
    'table (person_id uuid, name text, shop_id uuid)',
    `declare
       found_person people%rowtype;
     begin
       select * into found_person from people where email = lower(p_email);
       if not found then return; end if;
       update sign_ins set revoked_at = now()
         where sign_ins.person_id = found_person.id and purpose = 'reset' and used_at is null and revoked_at is null;
       return query
         select found_person.id, found_person.name, m.shop_id from memberships m
         where m.person_id = found_person.id and m.left_at is null order by m.created_at, m.shop_id limit 1;
       if not found then return; end if;
       insert into sign_ins (person_id, purpose, family, token_hash, expires_at)
         values (found_person.id, 'reset', gen_random_uuid(), p_token_hash, p_expires_at);
     end`,
  );
  // A new password signs the person out everywhere.
  await createLookupFunction(
    knex,
    'use_reset(p_token_hash bytea, p_password_hash text)',
    'boolean',
    `declare
       found_person_id uuid;
     begin
       update sign_ins set used_at = now()
         where token_hash = p_token_hash and purpose = 'reset'
           and used_at is null and revoked_at is null and expires_at > now()
         returning person_id into found_person_id;
       if not found then return false; end if;
       update people set password_hash = p_password_hash where id = found_person_id;
       update sign_ins set revoked_at = now()
         where person_id = found_person_id and revoked_at is null and (purpose = 'session' or used_at is null);
       return true;
     end`,
  );
}

async function createInvitation(knex: Knex): Promise<void> {
  await createLookupFunction(
    knex,
    'find_invitation(p_token_hash bytea)',
    'table (shop_id uuid, shop_name text, email text, role text, password_hash text)',
    `begin
       return query
         select s.id, s.name, i.email, i.role, p.password_hash
         from invitations i join shops s on s.id = i.shop_id left join people p on p.email = i.email
         where i.token_hash = p_token_hash and i.accepted_at is null and i.revoked_at is null and i.expires_at > now();
     end`,
  );
  // Somebody who is known already keeps their name and password; the caller has checked the password.
  await createLookupFunction(
    knex,
    'accept_invitation(p_token_hash bytea, p_name text, p_password_hash text)',
    'table (person_id uuid, shop_id uuid, role text)',
    `declare
       taken invitations%rowtype;
       joined_id uuid;
     begin
       update invitations set accepted_at = now()
         where token_hash = p_token_hash and accepted_at is null and revoked_at is null and expires_at > now()
         returning * into taken;
       if not found then return; end if;
       insert into people (email, name, password_hash) values (taken.email, p_name, p_password_hash)
         on conflict (email) do update set email = excluded.email
         returning id into joined_id;
       insert into memberships (shop_id, person_id, role) values (taken.shop_id, joined_id, taken.role)
         on conflict (shop_id, person_id) do update set role = excluded.role, left_at = null;
       return query select joined_id, taken.shop_id, taken.role;
     end`,
  );
  // Whoever leaves a shop is signed out of it at once, not when a token runs out.
  await createLookupFunction(
    knex,
    'close_sessions_of(p_person_id uuid)',
    'void',
    `begin
       update sign_ins set revoked_at = now()
         where person_id = p_person_id and purpose = 'session' and revoked_at is null
           and shop_id = nullif(current_setting('app.shop_id', true), '')::uuid;
     end`,
  );
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    drop function close_sessions_of(uuid);
    drop function accept_invitation(bytea, text, text);
    drop function find_invitation(bytea);
    drop function use_reset(bytea, text);
    drop function open_reset(text, bytea, timestamptz);
    drop function close_session(bytea);
    drop function rotate_session(bytea, bytea, timestamptz, interval);
    drop function open_session(uuid, uuid, uuid, bytea, timestamptz);
    drop function find_sign_in(text);
  `);
}
