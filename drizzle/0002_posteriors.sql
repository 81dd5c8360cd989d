CREATE TABLE `posteriors` (
	`reading_id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`taken_at` integer NOT NULL,
	`engine_version` text NOT NULL,
	`input_hash` text NOT NULL,
	`step` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`reading_id`) REFERENCES `readings`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "posteriors_hash_is_one" CHECK(length("posteriors"."input_hash") = 64)
);
--> statement-breakpoint
CREATE INDEX `posteriors_household_taken_at_idx` ON `posteriors` (`household_id`,`taken_at`);--> statement-breakpoint
CREATE TABLE `tablets_found` (
	`dose_id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`tablets` integer NOT NULL,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`household_id`,`dose_id`) REFERENCES `plan_doses`(`household_id`,`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "tablets_found_in_range" CHECK("tablets_found"."tablets" between 0 and 50)
);
--> statement-breakpoint
CREATE INDEX `tablets_found_household_idx` ON `tablets_found` (`household_id`);--> statement-breakpoint
ALTER TABLE `pools` ADD `learning_from` integer;