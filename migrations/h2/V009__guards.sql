-- What is kept is never changed or removed: a trigger on each such table refuses UPDATE and DELETE,
-- and a foreign key of the table to itself refuses TRUNCATE, which no trigger sees.

create trigger trail_entry_append_only before update, delete on trail_entry
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table trail_entry add constraint trail_entry_not_truncated
  foreign key (number) references trail_entry (number);

create trigger credential_append_only before update, delete on credential
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table credential add constraint credential_not_truncated
  foreign key (id) references credential (id);

create trigger instrument_event_append_only before update, delete on instrument_event
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table instrument_event add constraint instrument_event_not_truncated
  foreign key (id) references instrument_event (id);

create trigger standard_certificate_append_only before update, delete on standard_certificate
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table standard_certificate add constraint standard_certificate_not_truncated
  foreign key (id) references standard_certificate (id);

create trigger certified_value_append_only before update, delete on certified_value
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table certified_value add constraint certified_value_not_truncated
  foreign key (id) references certified_value (id);

create trigger uncertainty_term_append_only before update, delete on uncertainty_term
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table uncertainty_term add constraint uncertainty_term_not_truncated
  foreign key (id) references uncertainty_term (id);

create trigger verification_plan_append_only before update, delete on verification_plan
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table verification_plan add constraint verification_plan_not_truncated
  foreign key (id) references verification_plan (id);

create trigger plan_revision_append_only before update, delete on plan_revision
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table plan_revision add constraint plan_revision_not_truncated
  foreign key (id) references plan_revision (id);

create trigger check_point_append_only before update, delete on check_point
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table check_point add constraint check_point_not_truncated
  foreign key (id) references check_point (id);

create trigger check_point_limit_append_only before update, delete on check_point_limit
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table check_point_limit add constraint check_point_limit_not_truncated
  foreign key (id) references check_point_limit (id);

create trigger run_append_only before update, delete on run
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table run add constraint run_not_truncated
  foreign key (number) references run (number);

create trigger run_standard_append_only before update, delete on run_standard
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table run_standard add constraint run_standard_not_truncated
  foreign key (id) references run_standard (id);

create trigger run_event_append_only before update, delete on run_event
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table run_event add constraint run_event_not_truncated
  foreign key (id) references run_event (id);

create trigger signature_append_only before update, delete on signature
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table signature add constraint signature_not_truncated
  foreign key (id) references signature (id);

create trigger run_conditions_append_only before update, delete on run_conditions
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table run_conditions add constraint run_conditions_not_truncated
  foreign key (id) references run_conditions (id);

create trigger reading_append_only before update, delete on reading
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table reading add constraint reading_not_truncated
  foreign key (id) references reading (id);

create trigger reading_strike_append_only before update, delete on reading_strike
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table reading_strike add constraint reading_strike_not_truncated
  foreign key (reading_id) references reading_strike (reading_id);

create trigger submission_append_only before update, delete on submission
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table submission add constraint submission_not_truncated
  foreign key (event_id) references submission (event_id);

create trigger finding_append_only before update, delete on finding
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table finding add constraint finding_not_truncated
  foreign key (id) references finding (id);

create trigger certificate_append_only before update, delete on certificate
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table certificate add constraint certificate_not_truncated
  foreign key (number) references certificate (number);

create trigger certificate_document_append_only before update, delete on certificate_document
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table certificate_document add constraint certificate_document_not_truncated
  foreign key (number) references certificate_document (number);

create trigger certificate_event_append_only before update, delete on certificate_event
  for each row call 'org.evenbeam.store.guard.AppendOnly';
alter table certificate_event add constraint certificate_event_not_truncated
  foreign key (id) references certificate_event (id);

-- What may change is never removed.

create trigger laboratory_never_removed before delete on laboratory
  for each row call 'org.evenbeam.store.guard.NeverRemoved';
alter table laboratory add constraint laboratory_not_truncated
  foreign key (id) references laboratory (id);

create trigger person_never_removed before delete on person
  for each row call 'org.evenbeam.store.guard.NeverRemoved';
alter table person add constraint person_not_truncated
  foreign key (id) references person (id);

create trigger instrument_never_removed before delete on instrument
  for each row call 'org.evenbeam.store.guard.NeverRemoved';
alter table instrument add constraint instrument_not_truncated
  foreign key (id) references instrument (id);

create trigger reference_standard_never_removed before delete on reference_standard
  for each row call 'org.evenbeam.store.guard.NeverRemoved';
alter table reference_standard add constraint reference_standard_not_truncated
  foreign key (id) references reference_standard (id);

create trigger chain_head_never_removed before delete on chain_head
  for each row call 'org.evenbeam.store.guard.NeverRemoved';
alter table chain_head add constraint chain_head_not_truncated
  foreign key (id) references chain_head (id);
