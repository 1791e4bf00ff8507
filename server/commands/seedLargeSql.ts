/*
 * The rows of an archive that a plain COPY brings in, made into worksheets by
 * the database itself. The RFC 8785 form of these few fields is written by
 * hand: keys in order, no spaces, texts as JSON writes them.
 */

/** What one line of the COPY holds, in order. */
export const STAGED = [
  'id uuid',
  'number text',
  'lead_id uuid',
  'lead_name text',
  'site_id uuid',
  'site_name text',
  'created text',
  'starts text',
  'ends text',
  'kind integer',
  'area text',
  'equipment text',
  'task text',
  'description text',
  'work_order text',
  'system text',
  'volts integer',
  'panel text',
  'circuit text',
] as const;

const CONTENT = `format(
  '{"crew":[{"id":"c1","lead":true,"name":%s,"userId":"%s"}],"decision":{"mode":"off"},'
  '"job":{"area":%s,"description":%s,"endsAt":"%s","equipment":%s,"siteId":"%s","startsAt":"%s","task":%s,"workOrder":%s},'
  '"supply":{"circuit":%s,"circuitVolts":%s,"panel":%s,"system":%s}}',
  to_json(lead_name), lead_id, to_json(area), to_json(description), ends, to_json(equipment), site_id,
  starts, to_json(task), to_json(work_order), to_json(circuit), volts, to_json(panel), to_json(system))`;

const EVENT = `format(
  '{"actorId":"%s","at":"%s","enteredById":null,"payload":{"leadId":"%s","number":"%s","state":"closed"},'
  '"previousHash":null,"revision":1,"seq":%s,"subjectId":"%s","subjectType":"worksheet","type":"created"}',
  lead_id, created, lead_id, number, seq, id)`;

const hash = (text: string) => `encode(sha256(convert_to(${text}, 'UTF8')), 'hex')`;

/**
 * Tables of this connection only: what was copied, and how each kind of job
 * was judged. Indexes that only make reading quick are made anew at the end,
 * which takes a fraction of keeping them up row by row. All of it is one
 * transaction: where it fails, nothing has changed.
 */
export const PREPARE = `
  BEGIN;
  SET LOCAL maintenance_work_mem = '256MB';
  CREATE TEMP TABLE rebuilt ON COMMIT DROP AS
    SELECT indexrelid::regclass::text AS name, pg_get_indexdef(indexrelid) AS definition
      FROM pg_index
     WHERE NOT indisunique
       AND indrelid IN ('worksheets'::regclass, 'worksheet_revisions'::regclass, 'events'::regclass);
  DO $do$ DECLARE each record; BEGIN
    FOR each IN SELECT name FROM rebuilt LOOP EXECUTE 'DROP INDEX ' || each.name; END LOOP;
  END $do$;
  CREATE TEMP TABLE staged (${STAGED.join(', ')});
  CREATE TEMP TABLE kinds (kind integer, edition text, verdict text, stops integer, opens integer,
                           cautions integer, codes text[], standing jsonb);
`;

/** Makes worksheets, revisions and events of what was copied, and forgets it. */
export const TAKE = `
  CREATE TEMP TABLE made AS
    SELECT staged.*, nextval('events_seq_seq') AS seq, ${CONTENT} AS content FROM staged;
  INSERT INTO worksheets (id, number, state, lead_id, created_by_id, author_ids, crew_ids, signed_crew_ids,
      site_id, starts_at, ends_at, mode, task, system, circuit_volts, area, equipment,
      verdict, stop_count, open_count, caution_count, finding_codes, standing,
      search_document, created_at, updated_at)
    SELECT id, number, 'closed', lead_id, lead_id, ARRAY[lead_id], ARRAY[lead_id], ARRAY[lead_id],
      site_id, starts::timestamptz, ends::timestamptz, 'off', task, system, volts, area, equipment,
      verdict, stops, opens, cautions, codes, standing,
      concat_ws(E'\\n', number, site_name, area, equipment, task, description, work_order,
                panel || '/' || circuit, lead_name),
      created::timestamptz, created::timestamptz
      FROM made JOIN kinds USING (kind);
  INSERT INTO worksheet_revisions (worksheet_id, revision, content, content_hash, edition,
      created_by_id, created_at, updated_at)
    SELECT id, 1, content::jsonb,
      ${hash(`'{"attachments":[],"content":' || content || ',"revision":1,"worksheetId":"' || id || '"}'`)},
      edition, lead_id, created::timestamptz, created::timestamptz
      FROM made JOIN kinds USING (kind);
  INSERT INTO events (seq, subject_type, subject_id, revision, type, actor_id, at, payload, hash)
    SELECT seq, 'worksheet', id, 1, 'created', lead_id, created::timestamptz,
      jsonb_build_object('number', number, 'leadId', lead_id, 'state', 'closed'), ${hash(EVENT)}
      FROM made;
  INSERT INTO worksheet_numbers (year, last)
    SELECT left(number, 4)::integer, max(substr(number, 6)::integer) FROM made GROUP BY 1
    ON CONFLICT (year) DO UPDATE SET last = greatest(worksheet_numbers.last, excluded.last);
  TRUNCATE staged;
  DROP TABLE made;
`;

/** The indexes again, and what the planner knows of the new rows. */
export const FINISH = `
  DO $do$ DECLARE each record; BEGIN
    FOR each IN SELECT definition FROM rebuilt LOOP EXECUTE each.definition; END LOOP;
  END $do$;
  COMMIT;
  VACUUM (ANALYZE) worksheets, worksheet_revisions, events;
`;
