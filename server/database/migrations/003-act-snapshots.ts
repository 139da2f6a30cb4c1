/**
 * A save may be given its whole document afterwards, when an act rests on it:
 * once, and only the document that it was stored under the hash of.
 */
export const actSnapshots = `
create or replace function refuse_save_change() returns trigger language plpgsql as $$
begin
  if tg_op = 'DELETE' or (to_jsonb(new) - 'label' - 'snapshot') is distinct from (to_jsonb(old) - 'label' - 'snapshot') then
    raise exception 'a save is never overwritten' using errcode = 'insufficient_privilege';
  end if;
  if new.snapshot is distinct from old.snapshot and
     (old.snapshot is not null or encode(sha256(convert_to(new.snapshot, 'UTF8')), 'hex') is distinct from old.document_hash) then
    raise exception 'a snapshot is given once, and is the document of its save' using errcode = 'insufficient_privilege';
  end if;
  return new;
end $$;
`
