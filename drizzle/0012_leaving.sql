ALTER TABLE `people` ADD `deleted_at` integer;--> statement-breakpoint
ALTER TABLE `sessions` ADD `device` text;--> statement-breakpoint
ALTER TABLE `sessions` ADD `started_at` integer;--> statement-breakpoint
ALTER TABLE `sessions` ADD `last_seen_at` integer;