CREATE TABLE "engines" (
	"id" uuid PRIMARY KEY NOT NULL,
	"owner_id" text NOT NULL,
	"name" text NOT NULL,
	"bore_mm" double precision NOT NULL,
	"stroke_mm" double precision NOT NULL,
	"cylinders" integer NOT NULL,
	"action" text NOT NULL,
	"speed_rpm" double precision NOT NULL,
	"cut_off_percent" double precision NOT NULL,
	"pressure_pa" double precision NOT NULL,
	"kept_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "engines" ADD CONSTRAINT "engines_owner_id_user_id_fk" FOREIGN KEY ("owner_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "engines_owner_id_kept_at_index" ON "engines" USING btree ("owner_id","kept_at");