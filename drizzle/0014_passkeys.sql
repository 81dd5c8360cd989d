CREATE TABLE `passkey_challenges` (
	`digest` text PRIMARY KEY NOT NULL,
	`person_id` text,
	`expires_at` integer NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `passkey_challenges_expires_at_idx` ON `passkey_challenges` (`expires_at`);--> statement-breakpoint
CREATE INDEX `passkey_challenges_person_idx` ON `passkey_challenges` (`person_id`);--> statement-breakpoint
CREATE TABLE `passkeys` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`public_key` blob NOT NULL,
	`counter` integer NOT NULL,
	`transports` text NOT NULL,
	`name` text NOT NULL,
	`backed_up` integer NOT NULL,
	`created_at` integer NOT NULL,
	`last_used_at` integer,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "passkeys_name_has_length" CHECK(length("passkeys"."name") between 1 and 80),
	CONSTRAINT "passkeys_counter_in_range" CHECK("passkeys"."counter" between 0 and 4294967295)
);
--> statement-breakpoint
CREATE INDEX `passkeys_person_created_at_idx` ON `passkeys` (`person_id`,`created_at`);