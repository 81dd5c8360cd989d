CREATE TABLE `try_outs` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`taken_at` integer NOT NULL,
	`taken_by` text,
	`reading_id` text,
	`changes` text NOT NULL,
	`wishes` text NOT NULL,
	`former` text NOT NULL,
	`put_back_at` integer,
	`put_back_by` text,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`taken_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`reading_id`) REFERENCES `readings`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`put_back_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "try_outs_put_back_after_taken" CHECK("try_outs"."put_back_at" >= "try_outs"."taken_at"),
	CONSTRAINT "try_outs_put_back_says_when" CHECK("try_outs"."put_back_by" is null or "try_outs"."put_back_at" is not null)
);
--> statement-breakpoint
CREATE INDEX `try_outs_household_taken_at_idx` ON `try_outs` (`household_id`,`taken_at`);