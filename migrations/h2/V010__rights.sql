-- What the everyday user may do; the owner's connection does the rest.

create role everyday;

grant select, insert on table trail_entry to everyday;
grant select, insert on table credential to everyday;
grant select, insert on table instrument_event to everyday;
grant select, insert on table standard_certificate to everyday;
grant select, insert on table certified_value to everyday;
grant select, insert on table uncertainty_term to everyday;
grant select, insert on table verification_plan to everyday;
grant select, insert on table plan_revision to everyday;
grant select, insert on table check_point to everyday;
grant select, insert on table check_point_limit to everyday;
grant select, insert on table run to everyday;
grant select, insert on table run_standard to everyday;
grant select, insert on table run_event to everyday;
grant select, insert on table signature to everyday;
grant select, insert on table run_conditions to everyday;
grant select, insert on table reading to everyday;
grant select, insert on table reading_strike to everyday;
grant select, insert on table submission to everyday;
grant select, insert on table finding to everyday;
grant select, insert on table certificate to everyday;
grant select, insert on table certificate_document to everyday;
grant select, insert on table certificate_event to everyday;

grant select, insert, update on table laboratory to everyday;
grant select, insert, update on table person to everyday;
grant select, insert, update on table instrument to everyday;
grant select, insert, update on table reference_standard to everyday;
grant select, update on table chain_head to everyday;
grant select, insert, update, delete on table scratch to everyday;
