-- "frame" named both the series and the standing verdict's column, so that no verdict and no delivery item could be written.
CREATE OR REPLACE FUNCTION check_verdict() RETURNS trigger LANGUAGE plpgsql AS $$
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
CREATE OR REPLACE FUNCTION check_delivery_item() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF EXISTS (SELECT 1 FROM generate_series(NEW.first, NEW.last) wanted(frame)
             LEFT JOIN standing_verdicts s ON s.version_id = NEW.version_id AND s.frame = wanted.frame
             WHERE s.verdict_id IS DISTINCT FROM NEW.verdict_id OR s.kind <> 'signed off') THEN
    RAISE EXCEPTION 'not all of frames %-% are signed off by this verdict', NEW.first, NEW.last USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint

-- A delivery is stopped by any later verdict on its frames that is no sign-off. Signing again does not undo that.
CREATE FUNCTION delivery_stopped(wanted uuid) RETURNS boolean LANGUAGE sql STABLE AS $$
  SELECT EXISTS (
    SELECT 1 FROM delivery_items i JOIN verdicts v ON v.id = i.verdict_id
    JOIN verdicts later ON later.version_id = i.version_id AND later.kind <> 'signed off' AND later.given_at > v.given_at
      AND later.first <= i.last AND later.last >= i.first
    WHERE i.delivery_id = wanted)
$$;
--> statement-breakpoint
CREATE FUNCTION check_publication() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF NEW.published_at IS NOT NULL AND OLD.published_at IS NULL AND (NEW.withdrawn_at IS NOT NULL OR delivery_stopped(NEW.id)) THEN
    RAISE EXCEPTION 'a delivery that was withdrawn, or whose sign-off was, cannot be published' USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER signed_when_published BEFORE UPDATE ON deliveries FOR EACH ROW EXECUTE FUNCTION check_publication();
--> statement-breakpoint
CREATE FUNCTION check_download() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF NOT EXISTS (SELECT 1 FROM deliveries d JOIN recipients r ON r.delivery_id = d.id AND r.person_id = NEW.person_id
                 WHERE d.id = NEW.delivery_id AND d.published_at IS NOT NULL AND d.withdrawn_at IS NULL
                 AND r.revoked_at IS NULL AND r.expires_at > now())
     OR delivery_stopped(NEW.delivery_id) THEN
    RAISE EXCEPTION 'nothing is taken through a door that is not open' USING ERRCODE = 'restrict_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER open_door BEFORE INSERT ON downloads FOR EACH ROW EXECUTE FUNCTION check_download();
