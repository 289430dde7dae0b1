import { Migration } from '@mikro-orm/migrations';

/** People, sessions, plans, trailers, traces and their events. */
export class InitialTables extends Migration {
  override up(): void {
    this.addSql(`create table person (
      id text not null,
      name text not null,
      email text not null,
      role text not null,
      password_hash text not null,
      closed integer not null default false,
      preferences json not null,
      last_sign_in_at datetime null,
      created_at datetime not null,
      primary key (id)
    )`);
    this.addSql('create index person_name_index on person (name)');
    this.addSql('create unique index person_email_unique on person (email)');
    this.addSql(`create table plan (
      id text not null,
      name text not null,
      revision integer not null,
      parts integer not null,
      circuits integer not null,
      created_at datetime not null,
      updated_at datetime not null,
      primary key (id)
    )`);
    this.addSql('create index plan_name_index on plan (name)');
    this.addSql(`create table plan_revision (
      id text not null,
      plan_id text not null,
      number integer not null,
      harness json not null,
      author_id text null,
      created_at datetime not null,
      constraint plan_revision_plan_id_foreign foreign key(plan_id)
        references plan(id) on delete restrict on update cascade,
      constraint plan_revision_author_id_foreign foreign key(author_id)
        references person(id) on delete restrict on update cascade,
      primary key (id)
    )`);
    this.addSql('create index plan_revision_plan_id_index on plan_revision (plan_id)');
    this.addSql('create index plan_revision_author_id_index on plan_revision (author_id)');
    this.addSql(
      'create unique index plan_revision_plan_id_number_unique on plan_revision (plan_id, number)',
    );
    this.addSql(`create table session (
      id text not null,
      person_id text not null,
      token_hash text not null,
      retired json not null,
      device_name text not null,
      created_at datetime not null,
      last_used_at datetime not null,
      expires_at datetime not null,
      ended_at datetime null,
      constraint session_person_id_foreign foreign key(person_id)
        references person(id) on delete cascade on update cascade,
      primary key (id)
    )`);
    this.addSql('create index session_person_id_index on session (person_id)');
    this.addSql(`create table trailer (
      id text not null,
      unit text not null,
      body_type text not null,
      length_metres double not null,
      width_metres double not null,
      year integer not null,
      plate text null,
      fleet text not null,
      notes text not null,
      second_sources json not null,
      abs integer not null,
      plan_id text null,
      version integer not null default 1,
      constraint trailer_plan_id_foreign foreign key(plan_id)
        references plan(id) on delete restrict on update cascade,
      primary key (id)
    )`);
    this.addSql('create unique index trailer_unit_unique on trailer (unit)');
    this.addSql('create index trailer_body_type_index on trailer (body_type)');
    this.addSql('create index trailer_plan_id_index on trailer (plan_id)');
    this.addSql(`create table trace (
      id text not null,
      format integer not null,
      trailer_id text not null,
      trailer_snapshot json not null,
      settings json not null,
      plan_revision_id text not null,
      author_id text not null,
      opened_at datetime not null,
      events integer not null default 0,
      step text not null,
      complaint text not null default '',
      power_ups integer not null default 0,
      found_label text null,
      signed_at datetime null,
      constraint trace_trailer_id_foreign foreign key(trailer_id)
        references trailer(id) on delete restrict on update cascade,
      constraint trace_plan_revision_id_foreign foreign key(plan_revision_id)
        references plan_revision(id) on delete restrict on update cascade,
      constraint trace_author_id_foreign foreign key(author_id)
        references person(id) on delete restrict on update cascade,
      primary key (id)
    )`);
    this.addSql('create index trace_trailer_id_index on trace (trailer_id)');
    this.addSql('create index trace_plan_revision_id_index on trace (plan_revision_id)');
    this.addSql('create index trace_author_id_index on trace (author_id)');
    this.addSql('create index trace_opened_at_index on trace (opened_at)');
    this.addSql('create index trace_step_index on trace (step)');
    this.addSql(`create table trace_circuit (
      trace_id text not null,
      circuit text not null,
      position integer not null,
      name text not null,
      constraint trace_circuit_trace_id_foreign foreign key(trace_id)
        references trace(id) on delete cascade on update cascade,
      primary key (trace_id, circuit)
    )`);
    this.addSql('create index trace_circuit_trace_id_index on trace_circuit (trace_id)');
    this.addSql('create index trace_circuit_circuit_index on trace_circuit (circuit)');
    this.addSql(`create table trace_event (
      id text not null,
      trace_id text not null,
      device text not null,
      seq integer not null,
      position integer not null,
      type text not null,
      body json not null,
      at text not null,
      received_at datetime not null,
      author_id text not null,
      constraint trace_event_trace_id_foreign foreign key(trace_id)
        references trace(id) on delete restrict on update cascade,
      constraint trace_event_author_id_foreign foreign key(author_id)
        references person(id) on delete restrict on update cascade,
      primary key (id)
    )`);
    this.addSql('create index trace_event_trace_id_index on trace_event (trace_id)');
    this.addSql('create index trace_event_author_id_index on trace_event (author_id)');
    this.addSql(
      'create unique index trace_event_trace_id_position_unique on trace_event (trace_id, position)',
    );
    this.addSql(
      'create unique index trace_event_trace_id_device_seq_unique on trace_event (trace_id, device, seq)',
    );
  }
}
