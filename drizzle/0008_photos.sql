CREATE TABLE `photos` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`kind` text NOT NULL,
	`reading_id` text,
	`product_id` text,
	`caption` text,
	`width_pixels` integer NOT NULL,
	`height_pixels` integer NOT NULL,
	`picture` blob NOT NULL,
	`small` blob NOT NULL,
	`added_at` integer NOT NULL,
	`added_by` text,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`reading_id`) REFERENCES `readings`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`added_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`household_id`,`product_id`) REFERENCES `shelf_products`(`household_id`,`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "photos_kind_known" CHECK("photos"."kind" in ('strip', 'label', 'equipment')),
	CONSTRAINT "photos_strip_has_reading" CHECK(("photos"."kind" = 'strip') = ("photos"."reading_id" is not null)),
	CONSTRAINT "photos_label_has_product" CHECK(("photos"."kind" = 'label') = ("photos"."product_id" is not null)),
	CONSTRAINT "photos_size_in_range" CHECK(length("photos"."picture") + length("photos"."small") <= 400000),
	CONSTRAINT "photos_caption_has_length" CHECK(length("photos"."caption") between 1 and 120)
);
--> statement-breakpoint
CREATE INDEX `photos_household_added_at_idx` ON `photos` (`household_id`,`added_at`);--> statement-breakpoint
CREATE INDEX `photos_reading_idx` ON `photos` (`reading_id`);