CREATE TABLE `account_links` (
	`token_digest` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`purpose` text NOT NULL,
	`email` text NOT NULL,
	`created_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`used_at` integer,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "account_links_purpose_known" CHECK("account_links"."purpose" in ('confirm-email', 'change-email', 'reset-password')),
	CONSTRAINT "account_links_email_is_normalised" CHECK("account_links"."email" = lower(trim("account_links"."email")))
);
--> statement-breakpoint
CREATE INDEX `account_links_person_idx` ON `account_links` (`person_id`);--> statement-breakpoint
CREATE INDEX `account_links_expires_at_idx` ON `account_links` (`expires_at`);--> statement-breakpoint
CREATE TABLE `outgoing_mails` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text,
	`person_id` text,
	`subject_id` text,
	`email` text NOT NULL,
	`language` text NOT NULL,
	`subject` text NOT NULL,
	`text` text,
	`html` text,
	`created_at` integer NOT NULL,
	`tries` integer DEFAULT 0 NOT NULL,
	`next_try_at` integer,
	`sent_at` integer,
	`refusal` text,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "outgoing_mails_language_known" CHECK("outgoing_mails"."language" in ('en', 'es')),
	CONSTRAINT "outgoing_mails_of_somebody" CHECK("outgoing_mails"."household_id" is not null or "outgoing_mails"."person_id" is not null),
	CONSTRAINT "outgoing_mails_sent_is_not_due" CHECK("outgoing_mails"."sent_at" is null or "outgoing_mails"."next_try_at" is null),
	CONSTRAINT "outgoing_mails_due_has_words" CHECK("outgoing_mails"."next_try_at" is null or "outgoing_mails"."text" is not null)
);
--> statement-breakpoint
CREATE INDEX `outgoing_mails_due_idx` ON `outgoing_mails` (`next_try_at`);--> statement-breakpoint
CREATE INDEX `outgoing_mails_subject_idx` ON `outgoing_mails` (`subject_id`);--> statement-breakpoint
CREATE INDEX `outgoing_mails_household_idx` ON `outgoing_mails` (`household_id`);--> statement-breakpoint
CREATE INDEX `outgoing_mails_person_idx` ON `outgoing_mails` (`person_id`);--> statement-breakpoint
ALTER TABLE `invitations` ADD `email` text;--> statement-breakpoint
ALTER TABLE `people` ADD `email_confirmed_at` integer;