-- What the role that the program runs as may do. Run after every migration.
do $$
declare t text;
begin
    execute format('grant usage on schema public to %I', '{role}');
    execute format('revoke all on all tables in schema public from %I', '{role}');
    foreach t in array array['entry', 'strike_out', 'follow_up_step', 'flag_event', 'episode_event', 'patient_fact', 'audit_event', 'unit_lookup',
                             'threshold_version', 'threshold_answer']
    loop
        execute format('grant select, insert on %I to %I', t, '{role}');
    end loop;
    foreach t in array array['unit', 'bed', 'patient', 'episode', 'bed_stay', 'flag', 'api_token', 'set_up', 'data_protection_keys']
    loop
        execute format('grant select, insert, update on %I to %I', t, '{role}');
    end loop;
    foreach t in array array['membership', 'account', 'account_claim', 'account_login', 'account_token', 'account_role', 'role', 'role_claim']
    loop
        execute format('grant select, insert, update, delete on %I to %I', t, '{role}');
    end loop;
    execute format('grant select on standing_entry, audit_head to %I', '{role}');
    execute format('grant usage, select on all sequences in schema public to %I', '{role}');
end $$;
