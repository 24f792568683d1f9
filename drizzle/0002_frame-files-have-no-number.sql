-- The trigger serves frames and frame_files; only frames have a number, and PL/pgSQL reads both sides of an AND.
CREATE OR REPLACE FUNCTION check_frame() RETURNS trigger LANGUAGE plpgsql AS $$
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
