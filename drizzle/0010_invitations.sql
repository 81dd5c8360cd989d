CREATE TABLE `invitations` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`token_digest` text NOT NULL,
	`name` text NOT NULL,
	`role` text NOT NULL,
	`chemicals_allowed` integer NOT NULL,
	`created_at` integer NOT NULL,
	`created_by` text,
	`expires_at` integer NOT NULL,
	`used_at` integer,
	`used_by` text,
	`withdrawn_at` integer,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`used_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "invitations_role_known" CHECK("invitations"."role" in ('owner', 'caretaker', 'viewer')),
	CONSTRAINT "invitations_name_has_length" CHECK(length("invitations"."name") between 1 and 80),
	CONSTRAINT "invitations_viewers_do_not_dose" CHECK("invitations"."chemicals_allowed" = 0 or "invitations"."role" <> 'viewer'),
	CONSTRAINT "invitations_used_or_withdrawn" CHECK("invitations"."used_at" is null or "invitations"."withdrawn_at" is null)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `invitations_token_digest_unique` ON `invitations` (`token_digest`);--> statement-breakpoint
CREATE INDEX `invitations_household_idx` ON `invitations` (`household_id`,`created_at`);--> statement-breakpoint
ALTER TABLE `memberships` ADD `chemicals_allowed` integer DEFAULT true NOT NULL;