-- The audit trail and the one row that names its newest entry.

create table trail_entry (
  number    bigint      not null,
  form      integer     not null,
  canonical large_bytes not null,
  hash      varchar(64) not null,
  constraint trail_entry_key primary key (number),
  constraint trail_entry_hash_once unique (hash),
  constraint trail_entry_number_counts check (number >= 1),
  constraint trail_entry_form_known check (form >= 1)
);

create table chain_head (
  id     integer     not null,
  number bigint      not null,
  hash   varchar(64) not null,
  constraint chain_head_key primary key (id),
  constraint chain_head_single check (id = 1),
  constraint chain_head_number_counts check (number >= 0)
);

insert into chain_head (id, number, hash)
values (1, 0, '0000000000000000000000000000000000000000000000000000000000000000');
