CREATE TABLE `pool_events` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`kind` text NOT NULL,
	`happened_at` integer NOT NULL,
	`created_at` integer NOT NULL,
	`reported_by` text,
	`ended_at` integer,
	`ended_by` text,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`reported_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`ended_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "pool_events_kind_known" CHECK("pool_events"."kind" in ('storm', 'pump-failure', 'cover-off', 'drain-cover')),
	CONSTRAINT "pool_events_not_from_the_future" CHECK("pool_events"."happened_at" <= "pool_events"."created_at" + 60000)
);
--> statement-breakpoint
CREATE INDEX `pool_events_household_happened_at_idx` ON `pool_events` (`household_id`,`happened_at`);