CREATE TABLE `house_notes` (
	`household_id` text PRIMARY KEY NOT NULL,
	`professional_name` text,
	`professional_phone` text,
	`our_phone` text,
	`neighbour_name` text,
	`neighbour_phone` text,
	`gate` text,
	`breaker` text,
	`pump_switch` text,
	`chemicals` text,
	`updated_at` integer NOT NULL,
	`updated_by` text,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`updated_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE TABLE `situation_ticks` (
	`household_id` text NOT NULL,
	`situation_id` text NOT NULL,
	`step` text NOT NULL,
	`done_at` integer NOT NULL,
	`done_by` text,
	PRIMARY KEY(`situation_id`, `step`),
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`done_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`household_id`,`situation_id`) REFERENCES `situations`(`household_id`,`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE TABLE `situations` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`kind` text NOT NULL,
	`answers` text NOT NULL,
	`opened_at` integer NOT NULL,
	`opened_by` text,
	`ended_at` integer,
	`ended_by` text,
	`ending` text,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`opened_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`ended_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "situations_ending_says_when" CHECK(("situations"."ended_at" is null) = ("situations"."ending" is null)),
	CONSTRAINT "situations_end_after_they_open" CHECK("situations"."ended_at" >= "situations"."opened_at")
);
--> statement-breakpoint
CREATE UNIQUE INDEX `situations_one_open` ON `situations` (`household_id`) WHERE "situations"."ended_at" is null;--> statement-breakpoint
CREATE INDEX `situations_household_opened_at_idx` ON `situations` (`household_id`,`opened_at`);--> statement-breakpoint
CREATE UNIQUE INDEX `situations_household_id` ON `situations` (`household_id`,`id`);--> statement-breakpoint
CREATE TABLE `stop_confirmations` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`person_id` text NOT NULL,
	`product` text NOT NULL,
	`confirmed_at` integer NOT NULL,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `stop_confirmations_person_idx` ON `stop_confirmations` (`household_id`,`person_id`,`product`);--> statement-breakpoint
CREATE TABLE `visits` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`visited_on` text NOT NULL,
	`note` text,
	`created_at` integer NOT NULL,
	`recorded_by` text,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`recorded_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "visits_day_is_a_day" CHECK("visits"."visited_on" is null or "visits"."visited_on" is date("visits"."visited_on"))
);
--> statement-breakpoint
CREATE INDEX `visits_household_day_idx` ON `visits` (`household_id`,`visited_on`);