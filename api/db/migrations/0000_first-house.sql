CREATE TABLE "account" (
	"id" text PRIMARY KEY NOT NULL,
	"account_id" text NOT NULL,
	"provider_id" text NOT NULL,
	"user_id" text NOT NULL,
	"access_token" text,
	"refresh_token" text,
	"id_token" text,
	"access_token_expires_at" timestamp with time zone,
	"refresh_token_expires_at" timestamp with time zone,
	"scope" text,
	"password" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "rate_limit" (
	"id" text PRIMARY KEY NOT NULL,
	"key" text NOT NULL,
	"count" integer NOT NULL,
	"last_request" bigint NOT NULL,
	CONSTRAINT "rate_limit_key_unique" UNIQUE("key")
);
--> statement-breakpoint
CREATE TABLE "session" (
	"id" text PRIMARY KEY NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"token" text NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"ip_address" text,
	"user_agent" text,
	"user_id" text NOT NULL,
	"enrolment_skipped" boolean DEFAULT false NOT NULL,
	CONSTRAINT "session_token_unique" UNIQUE("token")
);
--> statement-breakpoint
CREATE TABLE "two_factor" (
	"id" text PRIMARY KEY NOT NULL,
	"secret" text NOT NULL,
	"backup_codes" text NOT NULL,
	"user_id" text NOT NULL,
	"verified" boolean DEFAULT true,
	"failed_verification_count" integer DEFAULT 0,
	"locked_until" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "user" (
	"id" text PRIMARY KEY NOT NULL,
	"name" text NOT NULL,
	"email" text NOT NULL,
	"email_verified" boolean DEFAULT false NOT NULL,
	"image" text,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL,
	"two_factor_enabled" boolean DEFAULT false,
	"units" text DEFAULT 'imperial' NOT NULL,
	CONSTRAINT "user_email_unique" UNIQUE("email")
);
--> statement-breakpoint
CREATE TABLE "verification" (
	"id" text PRIMARY KEY NOT NULL,
	"identifier" text NOT NULL,
	"value" text NOT NULL,
	"expires_at" timestamp with time zone NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "role_grants" (
	"user_id" text NOT NULL,
	"role" text NOT NULL,
	"granted_at" timestamp with time zone NOT NULL,
	"granted_by" text,
	"reason" text NOT NULL,
	"withdrawn_at" timestamp with time zone,
	"withdrawn_by" text,
	"withdrawn_reason" text,
	CONSTRAINT "role_grants_user_id_role_granted_at_pk" PRIMARY KEY("user_id","role","granted_at")
);
--> statement-breakpoint
CREATE TABLE "surveyors" (
	"user_id" text PRIMARY KEY NOT NULL,
	"number" integer GENERATED ALWAYS AS IDENTITY (sequence name "surveyors_number_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 2147483647 START WITH 11 CACHE 1),
	"town_id" integer NOT NULL,
	"range_km" integer NOT NULL,
	"types" text[] NOT NULL,
	"materials" text[] NOT NULL,
	"insured_until_on" date NOT NULL,
	"fees" jsonb NOT NULL,
	"about" text NOT NULL,
	"is_taking_jobs" boolean NOT NULL,
	"payout_account_id" text,
	"payouts_ready" boolean DEFAULT false NOT NULL,
	CONSTRAINT "surveyors_number_unique" UNIQUE("number")
);
--> statement-breakpoint
CREATE TABLE "documents" (
	"id" uuid PRIMARY KEY NOT NULL,
	"owner_id" text NOT NULL,
	"listing_id" uuid NOT NULL,
	"filename" text NOT NULL,
	"mime" text NOT NULL,
	"bytes" integer NOT NULL,
	"sha256" text NOT NULL,
	"uploaded_at" timestamp with time zone NOT NULL,
	"is_removed" boolean DEFAULT false NOT NULL
);
--> statement-breakpoint
CREATE TABLE "listing_addresses" (
	"listing_id" uuid PRIMARY KEY NOT NULL,
	"line1" text NOT NULL,
	"line2" text NOT NULL,
	"postcode" text NOT NULL,
	"access_notes" text NOT NULL
);
--> statement-breakpoint
CREATE TABLE "listing_events" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "listing_events_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"listing_id" uuid NOT NULL,
	"event" text NOT NULL,
	"from" text NOT NULL,
	"to" text NOT NULL,
	"actor_id" text,
	"reason" text DEFAULT '' NOT NULL,
	"at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "listings" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"slug" text NOT NULL,
	"seller_id" text NOT NULL,
	"status" text DEFAULT 'draft' NOT NULL,
	"draft" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"type" text,
	"material" text,
	"firing" text,
	"working_pressure_pa" real,
	"water_capacity_l" real,
	"asking_minor" bigint,
	"currency" text DEFAULT 'GBP' NOT NULL,
	"town_id" integer,
	"verdict" text,
	"condition" integer,
	"evidence" integer,
	"created_at" timestamp with time zone NOT NULL,
	"saved_at" timestamp with time zone NOT NULL,
	"published_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "photos" (
	"id" uuid PRIMARY KEY NOT NULL,
	"owner_id" text NOT NULL,
	"listing_id" uuid,
	"order_id" uuid,
	"view" text NOT NULL,
	"alt" text NOT NULL,
	"position" integer DEFAULT 0 NOT NULL,
	"filename" text NOT NULL,
	"mime" text NOT NULL,
	"bytes" integer NOT NULL,
	"sha256" text NOT NULL,
	"width" integer NOT NULL,
	"height" integer NOT NULL,
	"widths" integer[] NOT NULL,
	"uploaded_at" timestamp with time zone NOT NULL,
	"removed_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "survey_order_events" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "survey_order_events_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"order_id" uuid NOT NULL,
	"event" text NOT NULL,
	"from" text NOT NULL,
	"to" text NOT NULL,
	"actor_id" text,
	"reason" text DEFAULT '' NOT NULL,
	"at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "survey_orders" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"listing_id" uuid NOT NULL,
	"buyer_id" text NOT NULL,
	"seller_id" text NOT NULL,
	"surveyor_id" text NOT NULL,
	"status" text DEFAULT 'awaiting-payment' NOT NULL,
	"scope" text NOT NULL,
	"extras" text[] NOT NULL,
	"quotation" jsonb NOT NULL,
	"total_minor" integer NOT NULL,
	"currency" text NOT NULL,
	"proposed_times" timestamp with time zone[] DEFAULT '{}' NOT NULL,
	"appointment_at" timestamp with time zone,
	"placed_at" timestamp with time zone NOT NULL,
	"moved_at" timestamp with time zone NOT NULL,
	"due_at" timestamp with time zone,
	"early_start_requested_at" timestamp with time zone NOT NULL,
	CONSTRAINT "survey_orders_total" CHECK ("survey_orders"."total_minor" > 0)
);
--> statement-breakpoint
CREATE TABLE "ledger_lines" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "ledger_lines_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"posting_id" bigint NOT NULL,
	"account" text NOT NULL,
	"amount_minor" bigint NOT NULL,
	"currency" text NOT NULL
);
--> statement-breakpoint
CREATE TABLE "ledger_postings" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "ledger_postings_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"key" text NOT NULL,
	"what" text NOT NULL,
	"order_id" uuid NOT NULL,
	"at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "payment_moves" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "payment_moves_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"payment_id" uuid NOT NULL,
	"event" text NOT NULL,
	"from" text NOT NULL,
	"to" text NOT NULL,
	"reason" text DEFAULT '' NOT NULL,
	"at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "payment_notices" (
	"id" text PRIMARY KEY NOT NULL,
	"kind" text NOT NULL,
	"received_at" timestamp with time zone NOT NULL,
	"handled_at" timestamp with time zone,
	"outcome" text
);
--> statement-breakpoint
CREATE TABLE "payments" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"order_id" uuid NOT NULL,
	"status" text DEFAULT 'awaiting-card' NOT NULL,
	"amount_minor" integer NOT NULL,
	"currency" text NOT NULL,
	"checkout_id" text,
	"checkout_url" text,
	"payment_intent_id" text,
	"charge_id" text,
	"transfer_id" text,
	"refund_id" text,
	"created_at" timestamp with time zone NOT NULL,
	"moved_at" timestamp with time zone NOT NULL,
	CONSTRAINT "payments_amount" CHECK ("payments"."amount_minor" > 0)
);
--> statement-breakpoint
CREATE TABLE "reports" (
	"id" uuid PRIMARY KEY DEFAULT gen_random_uuid() NOT NULL,
	"order_id" uuid NOT NULL,
	"listing_id" uuid NOT NULL,
	"surveyor_id" text NOT NULL,
	"scope" text NOT NULL,
	"extras" text[] NOT NULL,
	"facts" jsonb NOT NULL,
	"record" jsonb NOT NULL,
	"result" jsonb NOT NULL,
	"sign_off" jsonb NOT NULL,
	"rubric_version" text NOT NULL,
	"filed_at" timestamp with time zone NOT NULL,
	"digest" text NOT NULL,
	"check_code" text NOT NULL
);
--> statement-breakpoint
CREATE TABLE "surveys" (
	"order_id" uuid PRIMARY KEY NOT NULL,
	"facts" jsonb NOT NULL,
	"record" jsonb NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"saved_at" timestamp with time zone NOT NULL,
	"filed_at" timestamp with time zone
);
--> statement-breakpoint
CREATE TABLE "office_acts" (
	"id" bigint PRIMARY KEY GENERATED ALWAYS AS IDENTITY (sequence name "office_acts_id_seq" INCREMENT BY 1 MINVALUE 1 MAXVALUE 9223372036854775807 START WITH 1 CACHE 1),
	"actor_id" text NOT NULL,
	"act" text NOT NULL,
	"subject" text NOT NULL,
	"subject_path" text,
	"reason" text NOT NULL,
	"at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
ALTER TABLE "account" ADD CONSTRAINT "account_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "session" ADD CONSTRAINT "session_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "two_factor" ADD CONSTRAINT "two_factor_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE cascade ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "role_grants" ADD CONSTRAINT "role_grants_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "role_grants" ADD CONSTRAINT "role_grants_granted_by_user_id_fk" FOREIGN KEY ("granted_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "role_grants" ADD CONSTRAINT "role_grants_withdrawn_by_user_id_fk" FOREIGN KEY ("withdrawn_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "surveyors" ADD CONSTRAINT "surveyors_user_id_user_id_fk" FOREIGN KEY ("user_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "documents" ADD CONSTRAINT "documents_owner_id_user_id_fk" FOREIGN KEY ("owner_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "documents" ADD CONSTRAINT "documents_listing_id_listings_id_fk" FOREIGN KEY ("listing_id") REFERENCES "public"."listings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "listing_addresses" ADD CONSTRAINT "listing_addresses_listing_id_listings_id_fk" FOREIGN KEY ("listing_id") REFERENCES "public"."listings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "listing_events" ADD CONSTRAINT "listing_events_listing_id_listings_id_fk" FOREIGN KEY ("listing_id") REFERENCES "public"."listings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "listing_events" ADD CONSTRAINT "listing_events_actor_id_user_id_fk" FOREIGN KEY ("actor_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "listings" ADD CONSTRAINT "listings_seller_id_user_id_fk" FOREIGN KEY ("seller_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_owner_id_user_id_fk" FOREIGN KEY ("owner_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "photos" ADD CONSTRAINT "photos_listing_id_listings_id_fk" FOREIGN KEY ("listing_id") REFERENCES "public"."listings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "survey_order_events" ADD CONSTRAINT "survey_order_events_order_id_survey_orders_id_fk" FOREIGN KEY ("order_id") REFERENCES "public"."survey_orders"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "survey_order_events" ADD CONSTRAINT "survey_order_events_actor_id_user_id_fk" FOREIGN KEY ("actor_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "survey_orders" ADD CONSTRAINT "survey_orders_listing_id_listings_id_fk" FOREIGN KEY ("listing_id") REFERENCES "public"."listings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "survey_orders" ADD CONSTRAINT "survey_orders_buyer_id_user_id_fk" FOREIGN KEY ("buyer_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "survey_orders" ADD CONSTRAINT "survey_orders_seller_id_user_id_fk" FOREIGN KEY ("seller_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "survey_orders" ADD CONSTRAINT "survey_orders_surveyor_id_user_id_fk" FOREIGN KEY ("surveyor_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "ledger_lines" ADD CONSTRAINT "ledger_lines_posting_id_ledger_postings_id_fk" FOREIGN KEY ("posting_id") REFERENCES "public"."ledger_postings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "ledger_postings" ADD CONSTRAINT "ledger_postings_order_id_survey_orders_id_fk" FOREIGN KEY ("order_id") REFERENCES "public"."survey_orders"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "payment_moves" ADD CONSTRAINT "payment_moves_payment_id_payments_id_fk" FOREIGN KEY ("payment_id") REFERENCES "public"."payments"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "payments" ADD CONSTRAINT "payments_order_id_survey_orders_id_fk" FOREIGN KEY ("order_id") REFERENCES "public"."survey_orders"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_order_id_survey_orders_id_fk" FOREIGN KEY ("order_id") REFERENCES "public"."survey_orders"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_listing_id_listings_id_fk" FOREIGN KEY ("listing_id") REFERENCES "public"."listings"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "reports" ADD CONSTRAINT "reports_surveyor_id_user_id_fk" FOREIGN KEY ("surveyor_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "surveys" ADD CONSTRAINT "surveys_order_id_survey_orders_id_fk" FOREIGN KEY ("order_id") REFERENCES "public"."survey_orders"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "office_acts" ADD CONSTRAINT "office_acts_actor_id_user_id_fk" FOREIGN KEY ("actor_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "documents_listing" ON "documents" USING btree ("listing_id");--> statement-breakpoint
CREATE INDEX "listing_events_listing" ON "listing_events" USING btree ("listing_id");--> statement-breakpoint
CREATE UNIQUE INDEX "listings_slug" ON "listings" USING btree ("slug");--> statement-breakpoint
CREATE INDEX "listings_seller" ON "listings" USING btree ("seller_id");--> statement-breakpoint
CREATE INDEX "listings_newest" ON "listings" USING btree ("status","published_at","id");--> statement-breakpoint
CREATE INDEX "listings_price" ON "listings" USING btree ("status","asking_minor","id");--> statement-breakpoint
CREATE INDEX "listings_type" ON "listings" USING btree ("status","type","published_at","id");--> statement-breakpoint
CREATE INDEX "photos_listing" ON "photos" USING btree ("listing_id","position");--> statement-breakpoint
CREATE INDEX "photos_order" ON "photos" USING btree ("order_id");--> statement-breakpoint
CREATE INDEX "survey_order_events_order" ON "survey_order_events" USING btree ("order_id");--> statement-breakpoint
CREATE INDEX "survey_orders_buyer" ON "survey_orders" USING btree ("buyer_id");--> statement-breakpoint
CREATE INDEX "survey_orders_seller" ON "survey_orders" USING btree ("seller_id");--> statement-breakpoint
CREATE INDEX "survey_orders_surveyor" ON "survey_orders" USING btree ("surveyor_id");--> statement-breakpoint
CREATE INDEX "survey_orders_listing" ON "survey_orders" USING btree ("listing_id");--> statement-breakpoint
CREATE INDEX "survey_orders_moved" ON "survey_orders" USING btree ("status","moved_at");--> statement-breakpoint
CREATE INDEX "ledger_lines_account" ON "ledger_lines" USING btree ("account");--> statement-breakpoint
CREATE INDEX "ledger_lines_posting" ON "ledger_lines" USING btree ("posting_id");--> statement-breakpoint
CREATE UNIQUE INDEX "ledger_postings_key" ON "ledger_postings" USING btree ("key");--> statement-breakpoint
CREATE INDEX "ledger_postings_order" ON "ledger_postings" USING btree ("order_id");--> statement-breakpoint
CREATE UNIQUE INDEX "payments_order" ON "payments" USING btree ("order_id");--> statement-breakpoint
CREATE INDEX "payments_checkout" ON "payments" USING btree ("checkout_id");--> statement-breakpoint
CREATE INDEX "payments_status" ON "payments" USING btree ("status","moved_at");--> statement-breakpoint
CREATE UNIQUE INDEX "reports_check_code" ON "reports" USING btree ("check_code");--> statement-breakpoint
CREATE INDEX "reports_listing" ON "reports" USING btree ("listing_id","filed_at");--> statement-breakpoint
CREATE UNIQUE INDEX "reports_order" ON "reports" USING btree ("order_id");--> statement-breakpoint
CREATE INDEX "office_acts_at" ON "office_acts" USING btree ("at");