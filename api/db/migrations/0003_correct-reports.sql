CREATE TABLE "report_repairs" (
	"id" uuid PRIMARY KEY NOT NULL,
	"report_id" uuid NOT NULL,
	"text" text NOT NULL,
	"done_on" date NOT NULL,
	"at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "report_replies" (
	"id" uuid PRIMARY KEY NOT NULL,
	"report_id" uuid NOT NULL,
	"criterion_id" text NOT NULL,
	"text" text NOT NULL,
	"at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
DROP INDEX "reports_order";--> statement-breakpoint
ALTER TABLE "reports" ADD COLUMN "version" integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE "reports" ADD COLUMN "corrects_report_id" uuid;--> statement-breakpoint
ALTER TABLE "reports" ADD COLUMN "correction_reason" text;--> statement-breakpoint
ALTER TABLE "surveys" ADD COLUMN "corrects_report_id" uuid;--> statement-breakpoint
ALTER TABLE "surveys" ADD COLUMN "correction_reason" text;--> statement-breakpoint
ALTER TABLE "report_repairs" ADD CONSTRAINT "report_repairs_report_id_reports_id_fk" FOREIGN KEY ("report_id") REFERENCES "public"."reports"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "report_replies" ADD CONSTRAINT "report_replies_report_id_reports_id_fk" FOREIGN KEY ("report_id") REFERENCES "public"."reports"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "report_repairs_report" ON "report_repairs" USING btree ("report_id");--> statement-breakpoint
CREATE UNIQUE INDEX "report_replies_finding" ON "report_replies" USING btree ("report_id","criterion_id");--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_corrects_report_id_reports_id_fk" FOREIGN KEY ("corrects_report_id") REFERENCES "public"."reports"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "surveys" ADD CONSTRAINT "surveys_corrects_report_id_reports_id_fk" FOREIGN KEY ("corrects_report_id") REFERENCES "public"."reports"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE UNIQUE INDEX "reports_order_version" ON "reports" USING btree ("order_id","version");--> statement-breakpoint
CREATE UNIQUE INDEX "reports_corrects" ON "reports" USING btree ("corrects_report_id");