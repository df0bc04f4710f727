-- A correction is the next version of a report of the same order, by the same surveyor, and says why. What the seller answers stands as written.
CREATE FUNCTION check_correction() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  IF NEW.corrects_report_id IS NULL THEN
    IF NEW.version <> 1 OR NEW.correction_reason IS NOT NULL THEN
      RAISE EXCEPTION 'a report that corrects none is version 1' USING ERRCODE = 'integrity_constraint_violation';
    END IF;
  ELSIF NEW.correction_reason IS NULL OR NOT EXISTS (
    SELECT 1 FROM reports
    WHERE id = NEW.corrects_report_id AND order_id = NEW.order_id AND surveyor_id = NEW.surveyor_id
      AND rubric_version = NEW.rubric_version AND version = NEW.version - 1
  ) THEN
    RAISE EXCEPTION 'report % is no next version of the one it corrects', NEW.id USING ERRCODE = 'integrity_constraint_violation';
  END IF;
  RETURN NEW;
END $$;
--> statement-breakpoint
CREATE TRIGGER reports_correction BEFORE INSERT ON reports FOR EACH ROW EXECUTE FUNCTION check_correction();
--> statement-breakpoint
CREATE TRIGGER report_replies_append_only BEFORE UPDATE OR DELETE ON report_replies FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER report_repairs_append_only BEFORE UPDATE OR DELETE ON report_repairs FOR EACH ROW EXECUTE FUNCTION refuse_change();
