CREATE TABLE "cut_earlier" (
	"cut_id" uuid NOT NULL,
	"version" integer NOT NULL,
	"told" jsonb NOT NULL,
	"replaced_at" timestamp with time zone NOT NULL,
	CONSTRAINT "cut_earlier_cut_id_version_pk" PRIMARY KEY("cut_id","version")
);
--> statement-breakpoint
CREATE TABLE "cut_photo" (
	"id" uuid PRIMARY KEY NOT NULL,
	"cut_id" uuid NOT NULL,
	"object_key" text NOT NULL,
	"width_px" integer NOT NULL,
	"height_px" integer NOT NULL,
	"created_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "in_service_note" (
	"id" uuid PRIMARY KEY NOT NULL,
	"cut_id" uuid NOT NULL,
	"result" text NOT NULL,
	"notes" text NOT NULL,
	"noted_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "decision" (
	"id" uuid PRIMARY KEY NOT NULL,
	"flag_id" uuid NOT NULL,
	"action" text NOT NULL,
	"reason" text NOT NULL,
	"decided_by" uuid NOT NULL,
	"decided_at" timestamp with time zone NOT NULL
);
--> statement-breakpoint
CREATE TABLE "flag" (
	"id" uuid PRIMARY KEY NOT NULL,
	"version" integer DEFAULT 1 NOT NULL,
	"design_id" uuid NOT NULL,
	"revision_id" uuid NOT NULL,
	"cut_id" uuid,
	"level" text NOT NULL,
	"reason" text NOT NULL,
	"raised_by" uuid,
	"finding" jsonb,
	"created_at" timestamp with time zone NOT NULL,
	"is_open" boolean DEFAULT true NOT NULL
);
--> statement-breakpoint
CREATE TABLE "notice" (
	"id" uuid PRIMARY KEY NOT NULL,
	"member_id" uuid NOT NULL,
	"kind" text NOT NULL,
	"sentence" text NOT NULL,
	"design_id" uuid,
	"created_at" timestamp with time zone NOT NULL,
	"read_at" timestamp with time zone
);
--> statement-breakpoint
ALTER TABLE "cut" ADD COLUMN "version" integer DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE "cut" ADD COLUMN "bit_id" uuid;--> statement-breakpoint
ALTER TABLE "cut" ADD COLUMN "bit_max_rpm" double precision;--> statement-breakpoint
ALTER TABLE "cut" ADD COLUMN "override_percent" double precision;--> statement-breakpoint
ALTER TABLE "cut" ADD COLUMN "went_wrong" text[] DEFAULT '{}' NOT NULL;--> statement-breakpoint
ALTER TABLE "cut" ADD COLUMN "measured" jsonb DEFAULT '[]'::jsonb NOT NULL;--> statement-breakpoint
ALTER TABLE "cut" ADD COLUMN "cut_on" date;--> statement-breakpoint
-- Cuts recorded before the column was there keep the day they were recorded on.
UPDATE "cut" SET "cut_on" = ("created_at" AT TIME ZONE 'UTC')::date;--> statement-breakpoint
ALTER TABLE "cut" ALTER COLUMN "cut_on" SET NOT NULL;--> statement-breakpoint
ALTER TABLE "cut" ADD COLUMN "corrected_at" timestamp with time zone;--> statement-breakpoint
ALTER TABLE "design" ADD COLUMN "parent_revision_id" uuid;--> statement-breakpoint
ALTER TABLE "cut_earlier" ADD CONSTRAINT "cut_earlier_cut_id_cut_id_fk" FOREIGN KEY ("cut_id") REFERENCES "public"."cut"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cut_photo" ADD CONSTRAINT "cut_photo_cut_id_cut_id_fk" FOREIGN KEY ("cut_id") REFERENCES "public"."cut"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "cut_photo" ADD CONSTRAINT "cut_photo_object_key_stored_object_key_fk" FOREIGN KEY ("object_key") REFERENCES "public"."stored_object"("key") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "in_service_note" ADD CONSTRAINT "in_service_note_cut_id_cut_id_fk" FOREIGN KEY ("cut_id") REFERENCES "public"."cut"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "decision" ADD CONSTRAINT "decision_flag_id_flag_id_fk" FOREIGN KEY ("flag_id") REFERENCES "public"."flag"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "decision" ADD CONSTRAINT "decision_decided_by_user_id_fk" FOREIGN KEY ("decided_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flag" ADD CONSTRAINT "flag_design_id_design_id_fk" FOREIGN KEY ("design_id") REFERENCES "public"."design"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flag" ADD CONSTRAINT "flag_revision_id_revision_id_fk" FOREIGN KEY ("revision_id") REFERENCES "public"."revision"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flag" ADD CONSTRAINT "flag_cut_id_cut_id_fk" FOREIGN KEY ("cut_id") REFERENCES "public"."cut"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "flag" ADD CONSTRAINT "flag_raised_by_user_id_fk" FOREIGN KEY ("raised_by") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "notice" ADD CONSTRAINT "notice_member_id_user_id_fk" FOREIGN KEY ("member_id") REFERENCES "public"."user"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
ALTER TABLE "notice" ADD CONSTRAINT "notice_design_id_design_id_fk" FOREIGN KEY ("design_id") REFERENCES "public"."design"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "cut_photo_cut" ON "cut_photo" USING btree ("cut_id");--> statement-breakpoint
CREATE INDEX "in_service_cut" ON "in_service_note" USING btree ("cut_id");--> statement-breakpoint
CREATE INDEX "decision_flag" ON "decision" USING btree ("flag_id");--> statement-breakpoint
CREATE INDEX "flag_open" ON "flag" USING btree ("is_open","created_at");--> statement-breakpoint
CREATE INDEX "flag_design" ON "flag" USING btree ("design_id");--> statement-breakpoint
CREATE INDEX "notice_member" ON "notice" USING btree ("member_id","created_at");--> statement-breakpoint
ALTER TABLE "design" ADD CONSTRAINT "design_parent_revision_id_revision_id_fk" FOREIGN KEY ("parent_revision_id") REFERENCES "public"."revision"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "cut_created" ON "cut" USING btree ("created_at");--> statement-breakpoint
CREATE INDEX "design_parent" ON "design" USING btree ("parent_revision_id");--> statement-breakpoint
CREATE INDEX "account_user" ON "account" USING btree ("user_id");--> statement-breakpoint
CREATE INDEX "session_user" ON "session" USING btree ("user_id");