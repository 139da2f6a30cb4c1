/**
 * What the database refuses whatever the application says: the trail and the
 * saves are insert-only, a frozen issue does not change, states move only
 * along the arrows of the state machine, one issue per note is on its way.
 * Triggers fire always, so a replica role cannot slip past them.
 */
export const refusals = `
alter table issue add constraint issue_state_known check (state in
  ('draft', 'in check', 'for approval', 'released', 'superseded', 'withdrawn', 'abandoned'));
create unique index issue_one_on_its_way on issue (note_id) where state in ('draft', 'in check', 'for approval');
create unique index issue_one_released on issue (note_id) where state = 'released';
alter table issue_part add constraint issue_part_known check (part in ('contributor', 'checker', 'approver'));
alter table project_member add constraint project_member_role_known check (role in ('analyst', 'checker', 'approver'));
alter table guard_answer add constraint guard_answer_kind_known check (kind in ('answer', 'deviation'));
alter table remark add constraint remark_state_known check (state in ('open', 'answered', 'closed'));
alter table tick add constraint tick_hash_is_sha256 check (length(hash) = 64);
alter table signature add constraint signature_void_has_reason check ((voided_at is null) = (void_reason is null));
create index issue_state_index on issue (state, last_change_at desc);
create index save_issue_index on save (issue_id, number desc);
create index trail_at_index on trail_row (at desc);
create index trail_actor_index on trail_row (actor_id, at desc);
create index remark_entry_remark_index on remark_entry (remark_id, at);
create index project_member_person_index on project_member (person_id);
create index note_project_index on note (project_id);

create function refuse_change() returns trigger language plpgsql as $$
begin
  raise exception '% is insert-only', tg_table_name using errcode = 'insufficient_privilege';
end $$;

create trigger trail_row_insert_only before update or delete on trail_row for each row execute function refuse_change();
create trigger trail_row_no_truncate before truncate on trail_row for each statement execute function refuse_change();
alter table trail_row enable always trigger trail_row_insert_only;
alter table trail_row enable always trigger trail_row_no_truncate;
create trigger remark_entry_insert_only before update or delete on remark_entry for each row execute function refuse_change();
alter table remark_entry enable always trigger remark_entry_insert_only;
create trigger issue_part_insert_only before update or delete on issue_part for each row execute function refuse_change();
alter table issue_part enable always trigger issue_part_insert_only;

create function refuse_save_change() returns trigger language plpgsql as $$
begin
  if tg_op = 'DELETE' or (to_jsonb(new) - 'label') is distinct from (to_jsonb(old) - 'label') then
    raise exception 'a save is never overwritten' using errcode = 'insufficient_privilege';
  end if;
  return new;
end $$;
create trigger save_kept before update or delete on save for each row execute function refuse_save_change();
alter table save enable always trigger save_kept;

create function guard_issue() returns trigger language plpgsql as $$
declare
  frozen text[] := array['note_id', 'letter', 'title', 'part', 'drawing_issue', 'change_note', 'save_number', 'document', 'document_hash', 'results', 'engine_version'];
  field text;
begin
  if tg_op = 'DELETE' then
    raise exception 'an issue is never deleted' using errcode = 'insufficient_privilege';
  end if;
  if old.state <> new.state and not (old.state || ' > ' || new.state) = any (array[
    'draft > in check', 'draft > abandoned', 'in check > draft', 'in check > for approval',
    'for approval > draft', 'for approval > released', 'released > superseded', 'released > withdrawn']) then
    raise exception 'an issue does not go from % to %', old.state, new.state using errcode = 'check_violation';
  end if;
  if old.state <> 'draft' then
    foreach field in array frozen loop
      if to_jsonb(new) -> field is distinct from to_jsonb(old) -> field then
        raise exception 'an issue in state % is frozen: % may not change', old.state, field using errcode = 'check_violation';
      end if;
    end loop;
  end if;
  if old.state in ('released', 'superseded', 'withdrawn') and
     (new.content_hash is distinct from old.content_hash or new.pdf_file_id is distinct from old.pdf_file_id) then
    raise exception 'the content hash and the PDF of a released issue may not change' using errcode = 'check_violation';
  end if;
  return new;
end $$;
create trigger issue_guarded before update or delete on issue for each row execute function guard_issue();
alter table issue enable always trigger issue_guarded;
`
