create table gone_lot (
  number integer primary key autoincrement,
  commodity_id text not null,
  variant text not null,
  name text not null,
  ended_on text not null,
  ended text not null check (ended in ('aged', 'ripe', 'sold', 'spoilt')),
  ripeness text not null,
  cured text not null check (cured in ('', 'yes', 'no')),
  used_pct real not null check (used_pct >= 0 and used_pct < 100),
  spells text not null,
  note text not null
) strict;
