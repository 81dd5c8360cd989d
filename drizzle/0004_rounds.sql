CREATE TABLE `rounds` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`done_at` integer NOT NULL,
	`created_at` integer NOT NULL,
	`done_by` text,
	`exceptions` text NOT NULL,
	`pressure_bar` real,
	`clean_pressure_bar` real,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`done_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "rounds_not_from_the_future" CHECK("rounds"."done_at" <= "rounds"."created_at" + 60000),
	CONSTRAINT "rounds_pressure_in_range" CHECK("rounds"."pressure_bar" between 0 and 6),
	CONSTRAINT "rounds_clean_pressure_in_range" CHECK("rounds"."clean_pressure_bar" between 0 and 6)
);
--> statement-breakpoint
CREATE INDEX `rounds_household_done_at_idx` ON `rounds` (`household_id`,`done_at`);