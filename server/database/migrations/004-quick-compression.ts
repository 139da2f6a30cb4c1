/**
 * The long texts of a note are written with every save: lz4 packs them in a third of the time of the usual way,
 * and unpacks them sooner still. A server that was built without it keeps the usual way. Rows that stand are
 * packed anew when they are next written.
 */
export const quickCompression = `
do $$
begin
  alter table issue alter column document set compression lz4, alter column results set compression lz4;
  alter table save alter column steps set compression lz4, alter column snapshot set compression lz4, alter column changed_results set compression lz4;
exception when feature_not_supported then
  raise notice 'lz4 is not there: texts are packed the usual way';
end $$;
`
