create table kept_plan (
  id integer primary key autoincrement,
  origin text not null,
  current integer not null,
  changed_at text not null
) strict;
create table kept_version (
  plan_id integer not null references kept_plan (id) on delete cascade,
  number integer not null,
  parent integer not null,
  name text not null,
  text text not null,
  note text not null,
  at text not null,
  primary key (plan_id, number)
) strict;
create table kept_body (
  digest text primary key,
  text text not null
) strict;
create table kept_file (
  plan_id integer not null,
  version integer not null,
  name text not null,
  digest text not null references kept_body (digest),
  primary key (plan_id, version, name),
  foreign key (plan_id, version) references kept_version (plan_id, number) on delete cascade
) strict;
