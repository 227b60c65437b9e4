CREATE TABLE "boats" (
	"id" text PRIMARY KEY NOT NULL,
	"document" jsonb NOT NULL,
	"demo" boolean DEFAULT false NOT NULL,
	"name" text GENERATED ALWAYS AS (("boats"."document" ->> 'name')) STORED NOT NULL,
	"type" text GENERATED ALWAYS AS (("boats"."document" ->> 'type')) STORED NOT NULL,
	"summary" text GENERATED ALWAYS AS (("boats"."document" ->> 'summary')) STORED NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
CREATE TABLE "setups" (
	"id" text PRIMARY KEY NOT NULL,
	"boat_id" text NOT NULL,
	"document" jsonb NOT NULL,
	"demo" boolean DEFAULT false NOT NULL,
	"name" text GENERATED ALWAYS AS (("setups"."document" ->> 'name')) STORED NOT NULL,
	"summary" text GENERATED ALWAYS AS (("setups"."document" ->> 'summary')) STORED NOT NULL,
	"source" text GENERATED ALWAYS AS (("setups"."document" ->> 'source')) STORED NOT NULL,
	"course_off_wind_deg" double precision GENERATED ALWAYS AS (abs(("setups"."document" -> 'conditions' ->> 'trueWindAngleDeg')::double precision)) STORED NOT NULL,
	"true_wind_speed_kn" double precision GENERATED ALWAYS AS ((("setups"."document" -> 'conditions' ->> 'trueWindSpeedKn')::double precision)) STORED NOT NULL,
	"wrong_on_purpose" boolean GENERATED ALWAYS AS (("setups"."document" ? 'flaw')) STORED NOT NULL,
	"created_at" timestamp with time zone DEFAULT now() NOT NULL,
	"updated_at" timestamp with time zone DEFAULT now() NOT NULL
);
--> statement-breakpoint
ALTER TABLE "setups" ADD CONSTRAINT "setups_boat_id_boats_id_fk" FOREIGN KEY ("boat_id") REFERENCES "public"."boats"("id") ON DELETE cascade ON UPDATE cascade;--> statement-breakpoint
CREATE INDEX "boats_demo_name_index" ON "boats" USING btree ("demo","name");--> statement-breakpoint
CREATE INDEX "setups_boat_course_index" ON "setups" USING btree ("boat_id","wrong_on_purpose","course_off_wind_deg","true_wind_speed_kn");--> statement-breakpoint
CREATE INDEX "setups_demo_index" ON "setups" USING btree ("demo");