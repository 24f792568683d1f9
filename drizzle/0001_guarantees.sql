-- The guarantees of PRODUCT.md that must hold whatever the code does.

-- 1. Rows that are written once.
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '% is written once: % is refused', TG_TABLE_NAME, TG_OP USING ERRCODE = 'restrict_violation';
END $$;
--> statement-breakpoint
DO $$
DECLARE name text;
BEGIN
  FOREACH name IN ARRAY ARRAY['versions','frames','frame_files','seals','submissions','verdicts','delivery_items',
                              'delivery_files','delivery_documents','receipts','events'] LOOP
    EXECUTE format('CREATE TRIGGER written_once BEFORE UPDATE OR DELETE ON %I FOR EACH ROW EXECUTE FUNCTION refuse_change()', name);
    EXECUTE format('CREATE TRIGGER never_emptied BEFORE TRUNCATE ON %I FOR EACH STATEMENT EXECUTE FUNCTION refuse_change()', name);
  END LOOP;
END $$;
--> statement-breakpoint

-- 2. Frames belong to the version's range, and none is added once it is sealed.
CREATE FUNCTION check_frame() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE version versions%ROWTYPE;
BEGIN
  SELECT * INTO version FROM versions WHERE id = NEW.version_id FOR SHARE;
  IF TG_TABLE_NAME = 'frames' THEN
    IF NEW.number NOT BETWEEN version.first AND version.last THEN
      RAISE EXCEPTION 'frame % is outside %-%', NEW.number, version.first, version.last USING ERRCODE = 'check_violation';
    END IF;
  END IF;
  IF EXISTS (SELECT 1 FROM seals WHERE version_id = NEW.version_id) THEN
    RAISE EXCEPTION 'version % is sealed: nothing can be added', NEW.version_id USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER within_version BEFORE INSERT ON frames FOR EACH ROW EXECUTE FUNCTION check_frame();
--> statement-breakpoint
CREATE TRIGGER within_version BEFORE INSERT ON frame_files FOR EACH ROW EXECUTE FUNCTION check_frame();
--> statement-breakpoint

-- 3. The version's digest: SHA-256 over the setup's digest, how it was rendered, and the checksum of every file.
CREATE FUNCTION version_manifest(wanted uuid) RETURNS text LANGUAGE sql STABLE AS $$
  SELECT concat_ws(E'\n',
    'ringwright version 1', 'setup ' || v.setup_digest, 'kernel ' || v.kernel, 'quality ' || v.quality,
    'colour ' || v.colour_space, 'channels ' || v.channels, 'frames ' || v.first || '-' || v.last,
    (SELECT string_agg(f.frame || ' ' || f.kind || ' ' || f.bytes || ' ' || f.sha256, E'\n' ORDER BY f.frame, f.kind COLLATE "C")
       FROM frame_files f WHERE f.version_id = v.id)) || E'\n'
  FROM versions v WHERE v.id = wanted
$$;
--> statement-breakpoint
CREATE FUNCTION version_digest(wanted uuid) RETURNS text LANGUAGE sql STABLE AS $$
  SELECT encode(sha256(convert_to(version_manifest(wanted), 'UTF8')), 'hex')
$$;
--> statement-breakpoint
CREATE FUNCTION check_seal() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE version versions%ROWTYPE; whole integer;
BEGIN
  SELECT * INTO version FROM versions WHERE id = NEW.version_id FOR UPDATE;
  SELECT count(*) INTO whole FROM frames f WHERE f.version_id = NEW.version_id
    AND (SELECT count(*) FROM frame_files x WHERE x.version_id = f.version_id AND x.frame = f.number) = 2;
  IF whole <> version.last - version.first + 1 THEN
    RAISE EXCEPTION 'only % of % frames are whole', whole, version.last - version.first + 1 USING ERRCODE = 'check_violation';
  END IF;
  IF NEW.frame_count <> whole OR NEW.digest <> version_digest(NEW.version_id) THEN
    RAISE EXCEPTION 'the digest is not that of the files' USING ERRCODE = 'check_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER digest_is_true BEFORE INSERT ON seals FOR EACH ROW EXECUTE FUNCTION check_seal();
--> statement-breakpoint

-- 4. A verdict: from the production's advisor, never on a version they made, on frames the version has.
CREATE FUNCTION check_verdict() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE version versions%ROWTYPE;
BEGIN
  SELECT * INTO version FROM versions WHERE id = NEW.version_id FOR UPDATE;
  IF NEW.given_by = version.made_by THEN
    RAISE EXCEPTION 'nobody judges a version they made' USING ERRCODE = 'restrict_violation';
  END IF;
  IF NEW.given_as <> 'advisor' OR NOT EXISTS (
    SELECT 1 FROM memberships m JOIN people p ON p.id = m.person_id AND p.left_at IS NULL
    WHERE m.production_id = version.production_id AND m.person_id = NEW.given_by AND m.role = 'advisor' AND m.ended_at IS NULL) THEN
    RAISE EXCEPTION 'only the production''s advisor gives a verdict' USING ERRCODE = 'restrict_violation';
  END IF;
  IF NEW.first < version.first OR NEW.last > version.last THEN
    RAISE EXCEPTION 'frames %-% are not all in %-%', NEW.first, NEW.last, version.first, version.last USING ERRCODE = 'check_violation';
  END IF;
  IF NEW.kind = 'withdrawn' AND EXISTS (
    SELECT 1 FROM generate_series(NEW.first, NEW.last) wanted(frame)
    LEFT JOIN standing_verdicts s ON s.version_id = NEW.version_id AND s.frame = wanted.frame
    WHERE s.kind IS DISTINCT FROM 'signed off') THEN
    RAISE EXCEPTION 'only frames that are signed off can be withdrawn' USING ERRCODE = 'check_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER given_rightly BEFORE INSERT ON verdicts FOR EACH ROW EXECUTE FUNCTION check_verdict();
--> statement-breakpoint
CREATE FUNCTION stand_verdict() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  INSERT INTO standing_verdicts (version_id, frame, verdict_id, kind)
  SELECT NEW.version_id, frame, NEW.id, NEW.kind FROM generate_series(NEW.first, NEW.last) frame
  ON CONFLICT (version_id, frame) DO UPDATE SET verdict_id = EXCLUDED.verdict_id, kind = EXCLUDED.kind;
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE TRIGGER stands AFTER INSERT ON verdicts FOR EACH ROW EXECUTE FUNCTION stand_verdict();
--> statement-breakpoint
CREATE FUNCTION only_by_verdict() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE verdict verdicts%ROWTYPE;
BEGIN
  IF TG_OP = 'DELETE' THEN
    RAISE EXCEPTION 'a standing verdict is superseded, never removed' USING ERRCODE = 'restrict_violation';
  END IF;
  SELECT * INTO verdict FROM verdicts WHERE id = NEW.verdict_id;
  IF verdict.version_id <> NEW.version_id OR verdict.kind <> NEW.kind OR NEW.frame NOT BETWEEN verdict.first AND verdict.last
     OR EXISTS (SELECT 1 FROM verdicts later WHERE later.version_id = NEW.version_id AND later.given_at > verdict.given_at
                AND NEW.frame BETWEEN later.first AND later.last) THEN
    RAISE EXCEPTION 'not the verdict that stands on frame %', NEW.frame USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER only_by_verdict BEFORE INSERT OR UPDATE OR DELETE ON standing_verdicts FOR EACH ROW EXECUTE FUNCTION only_by_verdict();
--> statement-breakpoint

-- 5. A delivery holds signed frames only, and is closed once published.
CREATE FUNCTION check_delivery_item() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF EXISTS (SELECT 1 FROM generate_series(NEW.first, NEW.last) wanted(frame)
             LEFT JOIN standing_verdicts s ON s.version_id = NEW.version_id AND s.frame = wanted.frame
             WHERE s.verdict_id IS DISTINCT FROM NEW.verdict_id OR s.kind <> 'signed off') THEN
    RAISE EXCEPTION 'not all of frames %-% are signed off by this verdict', NEW.first, NEW.last USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER signed_frames_only BEFORE INSERT ON delivery_items FOR EACH ROW EXECUTE FUNCTION check_delivery_item();
--> statement-breakpoint
CREATE FUNCTION check_delivery_file() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF NOT EXISTS (SELECT 1 FROM delivery_items i WHERE i.delivery_id = NEW.delivery_id AND i.version_id = NEW.version_id
                 AND NEW.frame BETWEEN i.first AND i.last) THEN
    RAISE EXCEPTION 'frame % is not among the delivery''s frames', NEW.frame USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER of_an_item BEFORE INSERT ON delivery_files FOR EACH ROW EXECUTE FUNCTION check_delivery_file();
--> statement-breakpoint
CREATE FUNCTION refuse_when_published() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF EXISTS (SELECT 1 FROM deliveries d WHERE d.id = NEW.delivery_id AND d.published_at IS NOT NULL) THEN
    RAISE EXCEPTION 'a published delivery is closed' USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER still_open BEFORE INSERT ON delivery_items FOR EACH ROW EXECUTE FUNCTION refuse_when_published();
--> statement-breakpoint
CREATE TRIGGER still_open BEFORE INSERT ON delivery_files FOR EACH ROW EXECUTE FUNCTION refuse_when_published();
--> statement-breakpoint
CREATE TRIGGER still_open BEFORE INSERT ON delivery_documents FOR EACH ROW EXECUTE FUNCTION refuse_when_published();
--> statement-breakpoint
CREATE FUNCTION keep_published() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF TG_OP = 'DELETE' OR (OLD.published_at IS NOT NULL AND
     (NEW.id, NEW.production_id, NEW.number, NEW.title, NEW.words, NEW.manifest_digest, NEW.bytes, NEW.made_by, NEW.published_at, NEW.published_by)
     IS DISTINCT FROM
     (OLD.id, OLD.production_id, OLD.number, OLD.title, OLD.words, OLD.manifest_digest, OLD.bytes, OLD.made_by, OLD.published_at, OLD.published_by)) THEN
    RAISE EXCEPTION 'a published delivery can only be withdrawn' USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER keep_published BEFORE UPDATE OR DELETE ON deliveries FOR EACH ROW EXECUTE FUNCTION keep_published();
--> statement-breakpoint
CREATE FUNCTION check_recipient() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF NOT EXISTS (SELECT 1 FROM deliveries d JOIN memberships m ON m.production_id = d.production_id
                 WHERE d.id = NEW.delivery_id AND m.person_id = NEW.person_id AND m.role = 'client' AND m.ended_at IS NULL) THEN
    RAISE EXCEPTION 'a delivery goes to a client of its own production' USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER a_client BEFORE INSERT ON recipients FOR EACH ROW EXECUTE FUNCTION check_recipient();
--> statement-breakpoint
CREATE FUNCTION check_receipt() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF NOT EXISTS (SELECT 1 FROM deliveries d WHERE d.id = NEW.delivery_id AND d.published_at IS NOT NULL
                 AND d.manifest_digest = NEW.manifest_digest) THEN
    RAISE EXCEPTION 'a receipt is signed under the digest of a published delivery' USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER under_its_digest BEFORE INSERT ON receipts FOR EACH ROW EXECUTE FUNCTION check_receipt();
--> statement-breakpoint

-- 6. The log: one chain for each production, each row carrying the hash of the one before.
CREATE FUNCTION event_hash(chain text, seq bigint, at timestamptz, actor uuid, kind text, subject jsonb, previous text)
RETURNS text LANGUAGE sql IMMUTABLE AS $$
  SELECT encode(sha256(convert_to(concat_ws(E'\n', previous, chain, seq,
    to_char(at AT TIME ZONE 'UTC', 'YYYY-MM-DD"T"HH24:MI:SS.US"Z"'), coalesce(actor::text, '-'), kind, subject::text), 'UTF8')), 'hex')
$$;
--> statement-breakpoint
CREATE FUNCTION chain_event() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE last record;
BEGIN
  NEW.chain := coalesce(NEW.production_id::text, 'studio');
  PERFORM pg_advisory_xact_lock(hashtextextended('events ' || NEW.chain, 0));
  SELECT e.seq, e.hash, e.at INTO last FROM events e WHERE e.chain = NEW.chain ORDER BY e.seq DESC LIMIT 1;
  NEW.seq := coalesce(last.seq, 0) + 1;
  NEW.previous := coalesce(last.hash, repeat('0', 64));
  NEW.at := greatest(coalesce(NEW.at, now()), coalesce(last.at, '-infinity'));
  NEW.hash := event_hash(NEW.chain, NEW.seq, NEW.at, NEW.actor_id, NEW.kind, NEW.subject, NEW.previous);
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER chained BEFORE INSERT ON events FOR EACH ROW EXECUTE FUNCTION chain_event();
--> statement-breakpoint
-- The first row at which a chain does not hold, or nothing when it is whole.
CREATE FUNCTION broken_event(wanted text) RETURNS bigint LANGUAGE sql STABLE AS $$
  SELECT min(seq) FROM (
    SELECT e.seq, e.hash = event_hash(e.chain, e.seq, e.at, e.actor_id, e.kind, e.subject, e.previous)
      AND e.previous = coalesce(lag(e.hash) OVER (ORDER BY e.seq), repeat('0', 64))
      AND e.seq = row_number() OVER (ORDER BY e.seq) AS holds
    FROM events e WHERE e.chain = wanted) checked
  WHERE NOT holds
$$;
--> statement-breakpoint

-- 7. What a shot's standing follows from: its newest version and everything that happened to it.
CREATE VIEW shot_facts AS
SELECT s.id AS shot_id, s.production_id, s.hold, v.id AS version_id, v.number AS version_number, v.made_by,
       r.state AS render_state, sub.sent_at,
       (SELECT count(*)::int FROM standing_verdicts x WHERE x.version_id = v.id AND x.kind = 'returned') AS returned_frames,
       (SELECT count(*)::int FROM standing_verdicts x WHERE x.version_id = v.id AND x.kind = 'signed off') AS signed_frames,
       v.last - v.first + 1 AS frame_count,
       EXISTS (SELECT 1 FROM delivery_items i JOIN deliveries d ON d.id = i.delivery_id
               WHERE i.version_id = v.id AND d.published_at IS NOT NULL AND d.withdrawn_at IS NULL) AS delivered,
       EXISTS (SELECT 1 FROM delivery_items i JOIN deliveries d ON d.id = i.delivery_id JOIN receipts q ON q.delivery_id = d.id
               WHERE i.version_id = v.id AND d.withdrawn_at IS NULL AND q.kind = 'received') AS received,
       EXISTS (SELECT 1 FROM delivery_items i JOIN deliveries d ON d.id = i.delivery_id JOIN receipts q ON q.delivery_id = d.id
               WHERE i.version_id = v.id AND d.withdrawn_at IS NULL AND q.kind = 'refused') AS refused
FROM shots s
LEFT JOIN LATERAL (SELECT * FROM versions w WHERE w.shot_id = s.id ORDER BY w.number DESC LIMIT 1) v ON true
LEFT JOIN renders r ON r.version_id = v.id
LEFT JOIN submissions sub ON sub.version_id = v.id;
