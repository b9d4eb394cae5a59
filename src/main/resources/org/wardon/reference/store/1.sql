create table own_value (
  commodity_id text not null,
  name text not null,
  low real not null,
  high real not null check (high >= low),
  unit text not null,
  set_at text not null,
  primary key (commodity_id, name)
) strict;
