CREATE TABLE `unproven_accounts` (
	`person_id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`password_hash` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "unproven_accounts_email_is_normalised" CHECK("unproven_accounts"."email" = lower(trim("unproven_accounts"."email")))
);
--> statement-breakpoint
CREATE INDEX `unproven_accounts_email_idx` ON `unproven_accounts` (`email`,`created_at`);