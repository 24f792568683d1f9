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
