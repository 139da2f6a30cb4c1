/**
 * The tables as of the first release of the schema. What the database itself
 * refuses (second parts, changed trail rows, edits of frozen issues) follows in 002.
 */
export const tables = `
create table attempt (
  key text not null,
  failures int not null,
  window_start timestamptz not null,
  blocked_until timestamptz null,
  constraint attempt_pkey primary key (key)
);
create table person (
  id uuid not null,
  email text not null,
  name text not null,
  password_hash text null,
  auditor boolean not null default false,
  administrator boolean not null default false,
  disabled_at timestamptz null,
  session_epoch int not null default 0,
  created_at timestamptz not null,
  constraint person_pkey primary key (id)
);
alter table person add constraint person_email_unique unique (email);
create table one_time_link (
  id uuid not null,
  person_id uuid not null,
  token_hash text not null,
  purpose text not null,
  created_at timestamptz not null,
  expires_at timestamptz not null,
  used_at timestamptz null,
  constraint one_time_link_pkey primary key (id)
);
alter table one_time_link add constraint one_time_link_token_hash_unique unique (token_hash);
create table mail (
  id uuid not null,
  event text not null,
  template text not null,
  recipient_id uuid not null,
  props jsonb not null,
  created_at timestamptz not null,
  sent_at timestamptz null,
  constraint mail_pkey primary key (id)
);
alter table mail add constraint mail_event_recipient_id_unique unique (event, recipient_id);
create table project (
  id uuid not null,
  code text not null,
  name text not null,
  note_pattern text not null,
  next_number int not null default 1,
  basis text not null,
  criteria text not null,
  created_at timestamptz not null,
  constraint project_pkey primary key (id)
);
alter table project add constraint project_code_unique unique (code);
create table note (
  id uuid not null,
  number text not null,
  project_id uuid not null,
  created_by_id uuid not null,
  created_at timestamptz not null,
  constraint note_pkey primary key (id)
);
alter table note add constraint note_number_unique unique (number);
create table issue (
  id uuid not null,
  note_id uuid not null,
  letter text not null,
  state text not null,
  release_requested_at timestamptz null,
  release_failure text null,
  title text not null,
  part text not null,
  drawing_issue text not null,
  change_note text not null,
  analyst_id uuid null,
  checker_id uuid null,
  approver_id uuid null,
  save_number int not null,
  saved_at timestamptz not null,
  saved_by_id uuid not null,
  document text not null,
  document_hash text not null,
  results text not null,
  engine_version text not null,
  content_hash text null,
  least_margin double precision null,
  least_margin_mode text null,
  least_margin_case text null,
  least_margin_calc uuid null,
  cautions int not null default 0,
  stops int not null default 0,
  last_change_at timestamptz not null,
  created_at timestamptz not null,
  released_at timestamptz null,
  pdf_file_id uuid null,
  version int not null default 1,
  constraint issue_pkey primary key (id)
);
alter table issue add constraint issue_note_id_letter_unique unique (note_id, letter);
create table loose_decision (
  id uuid not null,
  issue_id uuid not null,
  block_id text not null,
  text text not null,
  ordinal int not null,
  verdict text not null,
  reason text not null,
  author_id uuid not null,
  at timestamptz not null,
  constraint loose_decision_pkey primary key (id)
);
alter table loose_decision add constraint loose_decision_issue_id_block_id_text_ordinal_unique unique (issue_id, block_id, text, ordinal);
create table lease (
  issue_id uuid not null,
  person_id uuid not null,
  until timestamptz not null,
  constraint lease_pkey primary key (issue_id)
);
create table issue_part (
  id uuid not null,
  issue_id uuid not null,
  person_id uuid not null,
  part text not null,
  at timestamptz not null,
  constraint issue_part_pkey primary key (id)
);
alter table issue_part add constraint issue_part_issue_id_person_id_unique unique (issue_id, person_id);
create table guard_answer (
  id uuid not null,
  issue_id uuid not null,
  calc_id uuid not null,
  guard_key text not null,
  kind text not null,
  text text not null,
  facts jsonb not null,
  author_id uuid not null,
  at timestamptz not null,
  save_number int not null,
  judged_by_id uuid null,
  judged_at timestamptz null,
  accepted boolean null,
  judgement text not null default '',
  approved_by_id uuid null,
  approved_at timestamptz null,
  constraint guard_answer_pkey primary key (id)
);
alter table guard_answer add constraint guard_answer_issue_id_calc_id_guard_key_unique unique (issue_id, calc_id, guard_key);
create table check_entry (
  id uuid not null,
  issue_id uuid not null,
  item int not null,
  verdict text not null,
  evidence text not null,
  person_id uuid not null,
  at timestamptz not null,
  save_number int not null,
  hash text not null,
  constraint check_entry_pkey primary key (id)
);
alter table check_entry add constraint check_entry_issue_id_item_unique unique (issue_id, item);
create table project_member (
  id uuid not null,
  project_id uuid not null,
  person_id uuid not null,
  role text not null,
  since timestamptz not null,
  constraint project_member_pkey primary key (id)
);
alter table project_member add constraint project_member_project_id_person_id_role_unique unique (project_id, person_id, role);
create table remark (
  id uuid not null,
  issue_id uuid not null,
  number int not null,
  state text not null,
  anchor jsonb not null,
  anchor_state text not null,
  author_id uuid not null,
  at timestamptz not null,
  save_number int not null,
  closed_by_id uuid null,
  closed_at timestamptz null,
  constraint remark_pkey primary key (id)
);
alter table remark add constraint remark_issue_id_number_unique unique (issue_id, number);
create table remark_entry (
  id uuid not null,
  remark_id uuid not null,
  author_id uuid not null,
  at timestamptz not null,
  text text not null,
  proposed text null,
  file_id uuid null,
  constraint remark_entry_pkey primary key (id)
);
create table save (
  id uuid not null,
  issue_id uuid not null,
  number int not null,
  author_id uuid not null,
  at timestamptz not null,
  steps text not null,
  snapshot text null,
  document_hash text not null,
  changed_results text not null,
  engine_version text not null,
  label text null,
  idempotency_key uuid null,
  constraint save_pkey primary key (id)
);
alter table save add constraint save_issue_id_number_unique unique (issue_id, number);
alter table save add constraint save_issue_id_idempotency_key_unique unique (issue_id, idempotency_key);
create table signature (
  id uuid not null,
  issue_id uuid not null,
  person_id uuid not null,
  meaning text not null,
  at timestamptz not null,
  save_number int not null,
  content_hash text not null,
  voided_at timestamptz null,
  void_reason text null,
  constraint signature_pkey primary key (id)
);
create table stored_file (
  id uuid not null,
  issue_id uuid not null,
  purpose text not null,
  name text not null,
  mime text not null,
  size int not null,
  sha256 text not null,
  width int null,
  height int null,
  storage_key text not null,
  uploaded_by_id uuid null,
  at timestamptz not null,
  constraint stored_file_pkey primary key (id)
);
create table tick (
  id uuid not null,
  issue_id uuid not null,
  calc_id uuid not null,
  person_id uuid not null,
  at timestamptz not null,
  save_number int not null,
  hash text not null,
  constraint tick_pkey primary key (id)
);
alter table tick add constraint tick_issue_id_calc_id_unique unique (issue_id, calc_id);
create table trail_head (
  chain text not null,
  seq int not null,
  hash text not null,
  constraint trail_head_pkey primary key (chain)
);
create table trail_row (
  id uuid not null,
  chain text not null,
  seq int not null,
  at timestamptz not null,
  actor_id uuid null,
  act text not null,
  outcome text not null,
  subject_type text not null,
  subject_id text not null,
  subject_label text not null,
  old text null,
  new text null,
  reason text null,
  previous_hash text not null,
  hash text not null,
  constraint trail_row_pkey primary key (id)
);
alter table trail_row add constraint trail_row_chain_seq_unique unique (chain, seq);
alter table one_time_link add constraint one_time_link_person_id_foreign foreign key (person_id) references person (id) on update cascade;
alter table mail add constraint mail_recipient_id_foreign foreign key (recipient_id) references person (id) on update cascade;
alter table note add constraint note_project_id_foreign foreign key (project_id) references project (id) on update cascade;
alter table note add constraint note_created_by_id_foreign foreign key (created_by_id) references person (id) on update cascade;
alter table issue add constraint issue_note_id_foreign foreign key (note_id) references note (id) on update cascade;
alter table issue add constraint issue_analyst_id_foreign foreign key (analyst_id) references person (id) on update cascade on delete set null;
alter table issue add constraint issue_checker_id_foreign foreign key (checker_id) references person (id) on update cascade on delete set null;
alter table issue add constraint issue_approver_id_foreign foreign key (approver_id) references person (id) on update cascade on delete set null;
alter table issue add constraint issue_saved_by_id_foreign foreign key (saved_by_id) references person (id) on update cascade;
alter table loose_decision add constraint loose_decision_issue_id_foreign foreign key (issue_id) references issue (id) on update cascade;
alter table loose_decision add constraint loose_decision_author_id_foreign foreign key (author_id) references person (id) on update cascade;
alter table lease add constraint lease_issue_id_foreign foreign key (issue_id) references issue (id) on update cascade on delete cascade;
alter table lease add constraint lease_person_id_foreign foreign key (person_id) references person (id) on update cascade;
alter table issue_part add constraint issue_part_issue_id_foreign foreign key (issue_id) references issue (id) on update cascade;
alter table issue_part add constraint issue_part_person_id_foreign foreign key (person_id) references person (id) on update cascade;
alter table guard_answer add constraint guard_answer_issue_id_foreign foreign key (issue_id) references issue (id) on update cascade;
alter table guard_answer add constraint guard_answer_author_id_foreign foreign key (author_id) references person (id) on update cascade;
alter table guard_answer add constraint guard_answer_judged_by_id_foreign foreign key (judged_by_id) references person (id) on update cascade on delete set null;
alter table guard_answer add constraint guard_answer_approved_by_id_foreign foreign key (approved_by_id) references person (id) on update cascade on delete set null;
alter table check_entry add constraint check_entry_issue_id_foreign foreign key (issue_id) references issue (id) on update cascade;
alter table check_entry add constraint check_entry_person_id_foreign foreign key (person_id) references person (id) on update cascade;
alter table project_member add constraint project_member_project_id_foreign foreign key (project_id) references project (id) on update cascade;
alter table project_member add constraint project_member_person_id_foreign foreign key (person_id) references person (id) on update cascade;
alter table remark add constraint remark_issue_id_foreign foreign key (issue_id) references issue (id) on update cascade;
alter table remark add constraint remark_author_id_foreign foreign key (author_id) references person (id) on update cascade;
alter table remark add constraint remark_closed_by_id_foreign foreign key (closed_by_id) references person (id) on update cascade on delete set null;
alter table remark_entry add constraint remark_entry_remark_id_foreign foreign key (remark_id) references remark (id) on update cascade;
alter table remark_entry add constraint remark_entry_author_id_foreign foreign key (author_id) references person (id) on update cascade;
alter table save add constraint save_issue_id_foreign foreign key (issue_id) references issue (id) on update cascade;
alter table save add constraint save_author_id_foreign foreign key (author_id) references person (id) on update cascade;
alter table signature add constraint signature_issue_id_foreign foreign key (issue_id) references issue (id) on update cascade;
alter table signature add constraint signature_person_id_foreign foreign key (person_id) references person (id) on update cascade;
alter table stored_file add constraint stored_file_issue_id_foreign foreign key (issue_id) references issue (id) on update cascade;
alter table stored_file add constraint stored_file_uploaded_by_id_foreign foreign key (uploaded_by_id) references person (id) on update cascade on delete set null;
alter table tick add constraint tick_issue_id_foreign foreign key (issue_id) references issue (id) on update cascade;
alter table tick add constraint tick_person_id_foreign foreign key (person_id) references person (id) on update cascade;
`
