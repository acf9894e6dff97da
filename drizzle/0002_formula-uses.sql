CREATE TABLE "member_formula_uses" (
	"member_id" uuid NOT NULL,
	"formula" text NOT NULL,
	"address" text NOT NULL,
	"lines" integer NOT NULL,
	"combinations" integer NOT NULL,
	CONSTRAINT "member_formula_uses_member_id_formula_pk" PRIMARY KEY("member_id","formula")
);
--> statement-breakpoint
ALTER TABLE "member_formula_uses" ADD CONSTRAINT "member_formula_uses_member_id_members_id_fk" FOREIGN KEY ("member_id") REFERENCES "public"."members"("id") ON DELETE no action ON UPDATE no action;--> statement-breakpoint
CREATE INDEX "member_formula_uses_formula" ON "member_formula_uses" USING btree ("formula");--> statement-breakpoint
-- Members that were run before are run again at the next start, which fills the table.
UPDATE "members" SET "summary_engine" = '';
