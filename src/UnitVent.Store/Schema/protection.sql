-- What EF Core cannot say: append-only tables, row-level security, the audit chain, standing entries.
-- Run once, in the first migration, as the owner.

-- Append-only: not even the owner changes or removes what was charted.
create function refuse_change() returns trigger language plpgsql as $$
begin
    raise exception '% is append-only', tg_table_name using errcode = 'insufficient_privilege';
end $$;

do $$
declare t text;
begin
    foreach t in array array['entry', 'strike_out', 'follow_up_step', 'flag_event', 'episode_event', 'patient_fact', 'audit_event']
    loop
        execute format('create trigger %I before update or delete on %I for each row execute function refuse_change()', t || '_append_only', t);
        execute format('create trigger %I before truncate on %I for each statement execute function refuse_change()', t || '_no_truncate', t);
    end loop;
end $$;

-- Row-level security: a statement sees the rows of the unit that its transaction named, and none without one.
create function unit_in_scope() returns uuid language sql stable as $$
    select nullif(current_setting('unitvent.unit', true), '')::uuid
$$;

do $$
declare t text;
begin
    foreach t in array array['patient', 'patient_fact', 'episode', 'bed_stay', 'episode_event', 'entry', 'strike_out',
                             'follow_up_step', 'flag', 'flag_event', 'audit_event']
    loop
        execute format('alter table %I enable row level security', t);
        execute format('alter table %I force row level security', t);
        execute format('create policy unit_scope on %I using (unit_id = (select unit_in_scope())) with check (unit_id = (select unit_in_scope()))', t);
    end loop;
end $$;

-- The entries that count: neither struck out nor replaced. It runs with the rights of whoever asks.
create view standing_entry with (security_invoker = true) as
    select e.*
    from entry e
    where not exists (select from strike_out s where s.unit_id = e.unit_id and s.entry_id = e.id)
      and not exists (select from entry c where c.unit_id = e.unit_id and c.corrects = e.id);

-- The audit chain: each row of a unit is hashed together with the row before it. The head row serialises its writers.
create table audit_head (
    unit_id uuid primary key,
    number bigint not null,
    hash bytea not null
);

create function audit_text(unit_id uuid, number bigint, at timestamptz, who text, what text, subject uuid, detail text) returns text
language sql immutable as $$
    select concat_ws(E'\x1f', unit_id, number, extract(epoch from at)::numeric(20, 6), who, what, coalesce(subject::text, '-'), detail)
$$;

create function audit_link() returns trigger language plpgsql security definer set search_path = public, pg_temp as $$
declare head audit_head;
begin
    insert into audit_head values (new.unit_id, 0, '\x') on conflict do nothing;
    select * into head from audit_head h where h.unit_id = new.unit_id for update;
    new.number := head.number + 1;
    new.previous_hash := head.hash;
    new.hash := sha256(head.hash || convert_to(audit_text(new.unit_id, new.number, new.at, new.who, new.what, new.subject, new.detail), 'UTF8'));
    update audit_head h set number = new.number, hash = new.hash where h.unit_id = new.unit_id;
    return new;
end $$;

create trigger audit_event_link before insert on audit_event for each row execute function audit_link();

-- The first row of the unit in scope that does not follow from the one before it; no row when the chain holds.
create function audit_first_bad() returns table (number bigint) language sql stable as $$
    with link as (
        select e.*,
               lag(e.hash, 1, '\x'::bytea) over (order by e.number) as hash_before,
               lag(e.number, 1, 0::bigint) over (order by e.number) as number_before
        from audit_event e
    ),
    bad as (
        select l.number
        from link l
        where l.number <> l.number_before + 1
           or l.previous_hash <> l.hash_before
           or l.hash <> sha256(l.hash_before || convert_to(audit_text(l.unit_id, l.number, l.at, l.who, l.what, l.subject, l.detail), 'UTF8'))
        union all
        select h.number
        from audit_head h
        left join audit_event e on e.unit_id = h.unit_id and e.number = h.number
        where h.unit_id = (select unit_in_scope())
          and (e.hash is distinct from h.hash or exists (select from audit_event later where later.number > h.number))
    )
    select min(b.number) from bad b having min(b.number) is not null
$$;
