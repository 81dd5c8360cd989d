CREATE TABLE `hand_overs` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`membership_id` text NOT NULL,
	`from_day` text NOT NULL,
	`until_day` text NOT NULL,
	`chemicals_allowed` integer NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	`agreed_at` integer,
	`ended_at` integer,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`membership_id`) REFERENCES `memberships`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "hand_overs_from_is_day" CHECK("hand_overs"."from_day" is null or "hand_overs"."from_day" is date("hand_overs"."from_day")),
	CONSTRAINT "hand_overs_until_is_day" CHECK("hand_overs"."until_day" is null or "hand_overs"."until_day" is date("hand_overs"."until_day")),
	CONSTRAINT "hand_overs_days_in_order" CHECK("hand_overs"."from_day" <= "hand_overs"."until_day")
);
--> statement-breakpoint
CREATE INDEX `hand_overs_household_idx` ON `hand_overs` (`household_id`,`until_day`);