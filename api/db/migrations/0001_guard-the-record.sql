-- The ledger and the records of who did what are append-only, and every posting adds up to nothing.
CREATE FUNCTION refuse_change() RETURNS trigger LANGUAGE plpgsql AS $$
BEGIN
  RAISE EXCEPTION '% is append-only', TG_TABLE_NAME USING ERRCODE = 'integrity_constraint_violation';
END $$;
--> statement-breakpoint
CREATE FUNCTION check_posting_balances() RETURNS trigger LANGUAGE plpgsql AS $$
DECLARE posting bigint;
BEGIN
  IF TG_TABLE_NAME = 'ledger_postings' THEN posting := NEW.id; ELSE posting := NEW.posting_id; END IF;
  IF (SELECT count(*) FROM ledger_lines WHERE posting_id = posting) < 2 THEN
    RAISE EXCEPTION 'posting % has fewer than two lines', posting USING ERRCODE = 'integrity_constraint_violation';
  END IF;
  IF EXISTS (SELECT 1 FROM ledger_lines WHERE posting_id = posting GROUP BY currency HAVING sum(amount_minor) <> 0) THEN
    RAISE EXCEPTION 'posting % does not balance', posting USING ERRCODE = 'integrity_constraint_violation';
  END IF;
  RETURN NULL;
END $$;
--> statement-breakpoint
CREATE CONSTRAINT TRIGGER ledger_postings_balance AFTER INSERT ON ledger_postings
  DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION check_posting_balances();
--> statement-breakpoint
CREATE CONSTRAINT TRIGGER ledger_lines_balance AFTER INSERT ON ledger_lines
  DEFERRABLE INITIALLY DEFERRED FOR EACH ROW EXECUTE FUNCTION check_posting_balances();
--> statement-breakpoint
CREATE TRIGGER ledger_postings_append_only BEFORE UPDATE OR DELETE ON ledger_postings FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER ledger_lines_append_only BEFORE UPDATE OR DELETE ON ledger_lines FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER listing_events_append_only BEFORE UPDATE OR DELETE ON listing_events FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER survey_order_events_append_only BEFORE UPDATE OR DELETE ON survey_order_events FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER payment_moves_append_only BEFORE UPDATE OR DELETE ON payment_moves FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER office_acts_append_only BEFORE UPDATE OR DELETE ON office_acts FOR EACH ROW EXECUTE FUNCTION refuse_change();
--> statement-breakpoint
CREATE TRIGGER reports_append_only BEFORE UPDATE OR DELETE ON reports FOR EACH ROW EXECUTE FUNCTION refuse_change();
