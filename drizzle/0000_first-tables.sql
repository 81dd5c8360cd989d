CREATE TABLE `audit_trail` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`household_id` text NOT NULL,
	`person_id` text,
	`at` integer NOT NULL,
	`action` text NOT NULL,
	`subject_id` text,
	`detail` text,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `audit_trail_household_at_idx` ON `audit_trail` (`household_id`,`at`);--> statement-breakpoint
CREATE TABLE `dose_events` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`dose_id` text NOT NULL,
	`action` text NOT NULL,
	`status_from` text NOT NULL,
	`status_to` text NOT NULL,
	`amount_from` real,
	`amount_to` real,
	`given_at_from` integer,
	`given_at_to` integer,
	`plan_version_seen` integer NOT NULL,
	`recorded_by` text,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`recorded_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`household_id`,`dose_id`) REFERENCES `plan_doses`(`household_id`,`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "dose_events_action_known" CHECK("dose_events"."action" in ('claim', 'given', 'changed', 'skipped', 'undo')),
	CONSTRAINT "dose_events_status_from_known" CHECK("dose_events"."status_from" in ('planned', 'given', 'changed', 'skipped')),
	CONSTRAINT "dose_events_status_to_known" CHECK("dose_events"."status_to" in ('planned', 'given', 'changed', 'skipped'))
);
--> statement-breakpoint
CREATE INDEX `dose_events_dose_idx` ON `dose_events` (`dose_id`,`created_at`);--> statement-breakpoint
CREATE TABLE `households` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`time_zone` text NOT NULL,
	`unit_system` text NOT NULL,
	`locale` text NOT NULL,
	`demo` integer DEFAULT false NOT NULL,
	`expires_at` integer,
	`created_at` integer NOT NULL,
	CONSTRAINT "households_unit_system_known" CHECK("households"."unit_system" in ('us', 'metric')),
	CONSTRAINT "households_name_has_length" CHECK(length("households"."name") between 1 and 80),
	CONSTRAINT "households_only_demo_copies_expire" CHECK("households"."expires_at" is null or "households"."demo" = 1)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `households_one_demo_original` ON `households` (`demo`) WHERE demo = 1 and expires_at is null;--> statement-breakpoint
CREATE INDEX `households_expires_at_idx` ON `households` (`expires_at`);--> statement-breakpoint
CREATE TABLE `memberships` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`person_id` text NOT NULL,
	`role` text NOT NULL,
	`handles_chemicals` integer DEFAULT false NOT NULL,
	`safety_card_read_at` integer,
	`valid_from` integer NOT NULL,
	`valid_until` integer,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "memberships_role_known" CHECK("memberships"."role" in ('owner', 'caretaker', 'viewer')),
	CONSTRAINT "memberships_valid_in_order" CHECK("memberships"."valid_until" is null or "memberships"."valid_from" < "memberships"."valid_until"),
	CONSTRAINT "memberships_card_before_chemicals" CHECK("memberships"."handles_chemicals" = 0 or "memberships"."safety_card_read_at" is not null),
	CONSTRAINT "memberships_viewers_do_not_dose" CHECK("memberships"."handles_chemicals" = 0 or "memberships"."role" <> 'viewer')
);
--> statement-breakpoint
CREATE UNIQUE INDEX `memberships_one_open_per_person` ON `memberships` (`household_id`,`person_id`) WHERE valid_until is null;--> statement-breakpoint
CREATE INDEX `memberships_person_idx` ON `memberships` (`person_id`);--> statement-breakpoint
CREATE TABLE `people` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`email` text,
	`password_hash` text,
	`created_at` integer NOT NULL,
	CONSTRAINT "people_email_goes_with_password" CHECK(("people"."email" is null) = ("people"."password_hash" is null)),
	CONSTRAINT "people_email_is_normalised" CHECK("people"."email" = lower(trim("people"."email"))),
	CONSTRAINT "people_name_has_length" CHECK(length("people"."name") between 1 and 80)
);
--> statement-breakpoint
CREATE UNIQUE INDEX `people_email_unique` ON `people` (`email`);--> statement-breakpoint
CREATE TABLE `plan_doses` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`plan_id` text NOT NULL,
	`day` text NOT NULL,
	`wall_time` text NOT NULL,
	`at` integer NOT NULL,
	`product_id` text,
	`product_name` text,
	`to_buy` integer NOT NULL,
	`substance` text NOT NULL,
	`form` text NOT NULL,
	`amount` real NOT NULL,
	`unit` text NOT NULL,
	`rise` real NOT NULL,
	`reason` text NOT NULL,
	`effect` text,
	`status` text DEFAULT 'planned' NOT NULL,
	`given_at` integer,
	`given_amount` real,
	`done_by` text,
	`recorded_by` text,
	`ticked_at` integer,
	`claimed_by` text,
	`claimed_at` integer,
	`plan_version_seen` integer,
	`doubtful_at` integer,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`done_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`recorded_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`claimed_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`household_id`,`plan_id`) REFERENCES `plans`(`household_id`,`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "plan_doses_day_is_a_day" CHECK("plan_doses"."day" is null or "plan_doses"."day" is date("plan_doses"."day")),
	CONSTRAINT "plan_doses_wall_time_is_a_time" CHECK("plan_doses"."wall_time" is null or "plan_doses"."wall_time" is strftime('%H:%M', "plan_doses"."wall_time")),
	CONSTRAINT "plan_doses_substance_known" CHECK("plan_doses"."substance" in ('trichlor', 'dichlor', 'calcium-hypochlorite', 'sodium-hypochlorite', 'hydrochloric-acid', 'sodium-bisulfate', 'sodium-bicarbonate', 'sodium-carbonate', 'calcium-chloride', 'cyanuric-acid', 'sodium-thiosulfate')),
	CONSTRAINT "plan_doses_form_known" CHECK("plan_doses"."form" in ('tablet', 'granular', 'liquid', 'other')),
	CONSTRAINT "plan_doses_unit_known" CHECK("plan_doses"."unit" in ('tablet', 'g', 'mL')),
	CONSTRAINT "plan_doses_status_known" CHECK("plan_doses"."status" in ('planned', 'given', 'changed', 'skipped')),
	CONSTRAINT "plan_doses_amount_in_range" CHECK("plan_doses"."amount" > 0 and "plan_doses"."amount" <= 1e6),
	CONSTRAINT "plan_doses_to_buy_has_no_product" CHECK("plan_doses"."to_buy" = 0 or "plan_doses"."product_id" is null),
	CONSTRAINT "plan_doses_given_says_when_and_how_much" CHECK(("plan_doses"."status" in ('given', 'changed')) = ("plan_doses"."given_at" is not null) and ("plan_doses"."given_at" is null) = ("plan_doses"."given_amount" is null)),
	CONSTRAINT "plan_doses_given_amount_in_range" CHECK("plan_doses"."given_amount" > 0 and "plan_doses"."given_amount" <= 1e6)
);
--> statement-breakpoint
CREATE INDEX `plan_doses_household_at_idx` ON `plan_doses` (`household_id`,`at`);--> statement-breakpoint
CREATE INDEX `plan_doses_plan_idx` ON `plan_doses` (`plan_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `plan_doses_household_id` ON `plan_doses` (`household_id`,`id`);--> statement-breakpoint
CREATE TABLE `plan_failures` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`code` text NOT NULL,
	`engine_version` text NOT NULL,
	`input_hash` text NOT NULL,
	`failed_at` integer NOT NULL,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `plan_failures_household_idx` ON `plan_failures` (`household_id`,`failed_at`);--> statement-breakpoint
CREATE TABLE `plans` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`version` integer NOT NULL,
	`engine_version` text NOT NULL,
	`input_hash` text NOT NULL,
	`reading_id` text NOT NULL,
	`taken_at` integer NOT NULL,
	`ends_at` integer NOT NULL,
	`created_at` integer NOT NULL,
	`snapshot` text NOT NULL,
	`result` text NOT NULL,
	`superseded_at` integer,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`reading_id`) REFERENCES `readings`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "plans_version_counts_up" CHECK("plans"."version" >= 1),
	CONSTRAINT "plans_end_after_their_reading" CHECK("plans"."taken_at" < "plans"."ends_at")
);
--> statement-breakpoint
CREATE UNIQUE INDEX `plans_one_current` ON `plans` (`household_id`) WHERE superseded_at is null;--> statement-breakpoint
CREATE INDEX `plans_household_taken_at_idx` ON `plans` (`household_id`,`taken_at`);--> statement-breakpoint
CREATE INDEX `plans_reading_idx` ON `plans` (`reading_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `plans_household_version` ON `plans` (`household_id`,`version`);--> statement-breakpoint
CREATE UNIQUE INDEX `plans_household_id` ON `plans` (`household_id`,`id`);--> statement-breakpoint
CREATE TABLE `pools` (
	`household_id` text PRIMARY KEY NOT NULL,
	`next_step` text DEFAULT 'scope',
	`completed_at` integer,
	`record_only` integer DEFAULT false NOT NULL,
	`system` text,
	`kind` text,
	`roofed` integer,
	`new_surface` integer,
	`open_to_public` integer,
	`planted` integer,
	`ultraviolet_or_ozone` integer,
	`well_water` integer,
	`copper_heater` integer,
	`volume_source` text,
	`volume` real,
	`volume_estimated` integer,
	`entered_volume` real,
	`entered_unit` text,
	`entered_unit_confirmed` integer,
	`shape` text,
	`length_metres` real,
	`width_metres` real,
	`second_width_metres` real,
	`floor` text,
	`shallow_depth_metres` real,
	`deep_depth_metres` real,
	`mean_depth_metres` real,
	`surface` text,
	`place_name` text,
	`latitude` real,
	`longitude` real,
	`sun_exposure` real,
	`cover` text,
	`water_features` integer,
	`pump` text,
	`feeder_kind` text,
	`feeder_ingredient` text,
	`feeder_capacity_tablets` integer,
	`feeder_loaded_grams` real,
	`fill_calcium_hardness` real,
	`fill_total_alkalinity` real,
	`fill_ph` real,
	`fill_dissolved_solids` real,
	`test_methods` text,
	`swim_limit` real,
	`swim_limit_from_label` integer,
	`swim_limit_set_by` text,
	`swim_from` text,
	`swim_to` text,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`swim_limit_set_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "pools_next_step_known" CHECK("pools"."next_step" in ('scope', 'size', 'lining', 'sun', 'water', 'shelf', 'label')),
	CONSTRAINT "pools_system_known" CHECK("pools"."system" in ('chlorine', 'salt-generator', 'bromine', 'biguanide', 'copper-silver', 'unknown')),
	CONSTRAINT "pools_kind_known" CHECK("pools"."kind" in ('pool', 'pool-with-spa', 'hot-tub')),
	CONSTRAINT "pools_volume_in_range" CHECK("pools"."volume" between 0.2 and 1000),
	CONSTRAINT "pools_volume_source_known" CHECK("pools"."volume_source" in ('entered', 'measured')),
	CONSTRAINT "pools_entered_volume_has_unit" CHECK("pools"."volume_source" is not 'entered' or ("pools"."entered_volume" is not null and "pools"."entered_unit" is not null)),
	CONSTRAINT "pools_entered_unit_known" CHECK("pools"."entered_unit" in ('m3', 'L', 'us-gal')),
	CONSTRAINT "pools_shape_known" CHECK("pools"."shape" in ('rectangle', 'oval', 'round', 'freeform')),
	CONSTRAINT "pools_floor_known" CHECK("pools"."floor" in ('flat', 'slope', 'drop-off')),
	CONSTRAINT "pools_measured_volume_has_measures" CHECK("pools"."volume_source" is not 'measured' or ("pools"."shape" is not null and "pools"."length_metres" > 0 and "pools"."floor" is not null and "pools"."shallow_depth_metres" > 0)),
	CONSTRAINT "pools_deep_end_not_shallower" CHECK("pools"."shallow_depth_metres" <= "pools"."deep_depth_metres"),
	CONSTRAINT "pools_mean_depth_in_range" CHECK("pools"."mean_depth_metres" between 0.2 and 6),
	CONSTRAINT "pools_surface_known" CHECK("pools"."surface" in ('plaster', 'vinyl', 'fibreglass', 'tile', 'painted', 'unsure')),
	CONSTRAINT "pools_latitude_in_range" CHECK("pools"."latitude" between -90 and 90),
	CONSTRAINT "pools_longitude_in_range" CHECK("pools"."longitude" between -180 and 180),
	CONSTRAINT "pools_latitude_is_coarse" CHECK(abs("pools"."latitude" * 10 - round("pools"."latitude" * 10)) < 1e-6),
	CONSTRAINT "pools_longitude_is_coarse" CHECK(abs("pools"."longitude" * 10 - round("pools"."longitude" * 10)) < 1e-6),
	CONSTRAINT "pools_sun_exposure_is_a_share" CHECK("pools"."sun_exposure" between 0 and 1),
	CONSTRAINT "pools_cover_known" CHECK("pools"."cover" in ('none', 'floating', 'opaque')),
	CONSTRAINT "pools_feeder_kind_known" CHECK("pools"."feeder_kind" in ('none', 'inline', 'floating')),
	CONSTRAINT "pools_feeder_ingredient_known" CHECK("pools"."feeder_ingredient" in ('trichlor', 'dichlor', 'calcium-hypochlorite', 'other')),
	CONSTRAINT "pools_feeder_has_ingredient" CHECK("pools"."feeder_kind" is null or "pools"."feeder_kind" = 'none' or "pools"."feeder_ingredient" is not null),
	CONSTRAINT "pools_feeder_capacity_in_range" CHECK("pools"."feeder_capacity_tablets" between 0 and 60),
	CONSTRAINT "pools_feeder_loaded_in_range" CHECK("pools"."feeder_loaded_grams" between 0 and 20000),
	CONSTRAINT "pools_fill_hardness_in_range" CHECK("pools"."fill_calcium_hardness" between 0 and 2000),
	CONSTRAINT "pools_fill_alkalinity_in_range" CHECK("pools"."fill_total_alkalinity" between 0 and 1000),
	CONSTRAINT "pools_fill_ph_in_range" CHECK("pools"."fill_ph" between 5 and 10.5),
	CONSTRAINT "pools_fill_dissolved_solids_in_range" CHECK("pools"."fill_dissolved_solids" between 0 and 30000),
	CONSTRAINT "pools_swim_limit_in_range" CHECK("pools"."swim_limit" between 2 and 10),
	CONSTRAINT "pools_swim_hours_are_times" CHECK(("pools"."swim_from" is null or "pools"."swim_from" is strftime('%H:%M', "pools"."swim_from")) and ("pools"."swim_to" is null or "pools"."swim_to" is strftime('%H:%M', "pools"."swim_to"))),
	CONSTRAINT "pools_swim_hours_in_order" CHECK("pools"."swim_from" < "pools"."swim_to"),
	CONSTRAINT "pools_completed_means_answered" CHECK("pools"."completed_at" is null or ("pools"."system" is not null and "pools"."kind" is not null and "pools"."volume" is not null and "pools"."surface" is not null and "pools"."latitude" is not null and "pools"."longitude" is not null and "pools"."pump" is not null and "pools"."feeder_kind" is not null and "pools"."swim_limit" is not null and "pools"."swim_from" is not null and "pools"."swim_to" is not null))
);
--> statement-breakpoint
CREATE TABLE `preferences` (
	`household_id` text PRIMARY KEY NOT NULL,
	`visits` integer NOT NULL,
	`money` real NOT NULL,
	`evenings` real NOT NULL,
	`steadiness` real NOT NULL,
	`avoid` text NOT NULL,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "preferences_visits_in_a_week" CHECK("preferences"."visits" between 1 and 7),
	CONSTRAINT "preferences_money_in_range" CHECK("preferences"."money" between 0 and 3),
	CONSTRAINT "preferences_evenings_in_range" CHECK("preferences"."evenings" between 0 and 3),
	CONSTRAINT "preferences_steadiness_in_range" CHECK("preferences"."steadiness" between 0 and 3)
);
--> statement-breakpoint
CREATE TABLE `rate_limits` (
	`key` text PRIMARY KEY NOT NULL,
	`points` integer NOT NULL,
	`expires_at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `rate_limits_expires_at_idx` ON `rate_limits` (`expires_at`);--> statement-breakpoint
CREATE TABLE `reading_values` (
	`reading_id` text NOT NULL,
	`quantity` text NOT NULL,
	`low` real NOT NULL,
	`high` real NOT NULL,
	`exact` integer NOT NULL,
	PRIMARY KEY(`reading_id`, `quantity`),
	FOREIGN KEY (`reading_id`) REFERENCES `readings`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "reading_values_low_not_above_high" CHECK("reading_values"."low" <= "reading_values"."high"),
	CONSTRAINT "reading_values_exact_is_one_number" CHECK("reading_values"."exact" = 0 or "reading_values"."low" = "reading_values"."high"),
	CONSTRAINT "reading_values_quantity_known" CHECK("reading_values"."quantity" in ('freeChlorine', 'combinedChlorine', 'pH', 'totalAlkalinity', 'calciumHardness', 'cyanuricAcid', 'temperature')),
	CONSTRAINT "reading_values_in_model_range" CHECK(case "reading_values"."quantity" when 'freeChlorine' then "reading_values"."low" >= 0 and "reading_values"."high" <= 200 when 'combinedChlorine' then "reading_values"."low" >= 0 and "reading_values"."high" <= 50 when 'pH' then "reading_values"."low" >= 5 and "reading_values"."high" <= 10.5 when 'totalAlkalinity' then "reading_values"."low" >= 0 and "reading_values"."high" <= 1000 when 'calciumHardness' then "reading_values"."low" >= 0 and "reading_values"."high" <= 2000 when 'cyanuricAcid' then "reading_values"."low" >= 0 and "reading_values"."high" <= 500 when 'temperature' then "reading_values"."low" >= -2 and "reading_values"."high" <= 60 end)
);
--> statement-breakpoint
CREATE TABLE `reading_versions` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`reading_id` text NOT NULL,
	`replaced_at` integer NOT NULL,
	`replaced_by` text,
	`former` text NOT NULL,
	FOREIGN KEY (`reading_id`) REFERENCES `readings`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`replaced_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `reading_versions_reading_idx` ON `reading_versions` (`reading_id`);--> statement-breakpoint
CREATE TABLE `readings` (
	`id` text PRIMARY KEY NOT NULL,
	`household_id` text NOT NULL,
	`taken_at` integer NOT NULL,
	`created_at` integer NOT NULL,
	`kind` text NOT NULL,
	`method` text NOT NULL,
	`look` text NOT NULL,
	`zero_answer` text,
	`note` text,
	`done_by` text,
	`recorded_by` text,
	`deleted_at` integer,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`done_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`recorded_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "readings_kind_known" CHECK("readings"."kind" in ('full', 'quick')),
	CONSTRAINT "readings_method_known" CHECK("readings"."method" in ('strip', 'drop-kit', 'slip')),
	CONSTRAINT "readings_look_known" CHECK("readings"."look" in ('clear', 'cloudy', 'green')),
	CONSTRAINT "readings_zero_answer_known" CHECK("readings"."zero_answer" in ('flashed', 'stayed-pale')),
	CONSTRAINT "readings_note_has_length" CHECK(length("readings"."note") <= 500),
	CONSTRAINT "readings_not_from_the_future" CHECK("readings"."taken_at" <= "readings"."created_at" + 60000)
);
--> statement-breakpoint
CREATE INDEX `readings_household_taken_at_idx` ON `readings` (`household_id`,`taken_at`);--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`expires_at` integer NOT NULL,
	`household_id` text,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `sessions_person_idx` ON `sessions` (`person_id`);--> statement-breakpoint
CREATE INDEX `sessions_expires_at_idx` ON `sessions` (`expires_at`);--> statement-breakpoint
CREATE TABLE `shelf_products` (
	`household_id` text NOT NULL,
	`id` text NOT NULL,
	`name` text,
	`form` text NOT NULL,
	`substance` text NOT NULL,
	`strength` real,
	`alkali` real NOT NULL,
	`tablet_mass_grams` real,
	`label_way` text NOT NULL,
	`measure` real,
	`price_per_kg` real,
	`price_per_litre` real,
	`stock` real NOT NULL,
	`bought_on` text,
	`stored_at_celsius` real NOT NULL,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`household_id`, `id`),
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "shelf_products_id_has_length" CHECK(length("shelf_products"."id") between 1 and 64),
	CONSTRAINT "shelf_products_form_known" CHECK("shelf_products"."form" in ('tablet', 'granular', 'liquid', 'other')),
	CONSTRAINT "shelf_products_substance_known" CHECK("shelf_products"."substance" in ('trichlor', 'dichlor', 'calcium-hypochlorite', 'sodium-hypochlorite', 'hydrochloric-acid', 'sodium-bisulfate', 'sodium-bicarbonate', 'sodium-carbonate', 'calcium-chloride', 'cyanuric-acid', 'sodium-thiosulfate', 'other')),
	CONSTRAINT "shelf_products_label_way_known" CHECK("shelf_products"."label_way" in ('dissolve', 'broadcast', 'feeder-only', 'unknown')),
	CONSTRAINT "shelf_products_strength_in_range" CHECK("shelf_products"."strength" > 0 and "shelf_products"."strength" <= 100),
	CONSTRAINT "shelf_products_alkali_in_range" CHECK("shelf_products"."alkali" between 0 and 20),
	CONSTRAINT "shelf_products_tablet_mass_in_range" CHECK("shelf_products"."tablet_mass_grams" between 1 and 1000),
	CONSTRAINT "shelf_products_measure_in_range" CHECK("shelf_products"."measure" > 0 and "shelf_products"."measure" <= 20000),
	CONSTRAINT "shelf_products_price_per_kg_in_range" CHECK("shelf_products"."price_per_kg" between 0 and 10000),
	CONSTRAINT "shelf_products_price_per_litre_in_range" CHECK("shelf_products"."price_per_litre" between 0 and 10000),
	CONSTRAINT "shelf_products_stock_in_range" CHECK("shelf_products"."stock" between 0 and 10000000),
	CONSTRAINT "shelf_products_stored_at_in_range" CHECK("shelf_products"."stored_at_celsius" between -20 and 60),
	CONSTRAINT "shelf_products_bought_on_is_a_day" CHECK("shelf_products"."bought_on" is null or "shelf_products"."bought_on" is date("shelf_products"."bought_on"))
);
--> statement-breakpoint
CREATE TABLE `week_days` (
	`household_id` text NOT NULL,
	`day` text NOT NULL,
	`sky` real,
	`rain_millimetres` real,
	`swimmer_hours` real,
	`water_temperature_celsius` real,
	`evaporation_millimetres` real,
	`backwash_cubic_metres` real,
	PRIMARY KEY(`household_id`, `day`),
	FOREIGN KEY (`household_id`) REFERENCES `households`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "week_days_day_is_a_day" CHECK("week_days"."day" is null or "week_days"."day" is date("week_days"."day")),
	CONSTRAINT "week_days_sky_is_a_share" CHECK("week_days"."sky" between 0 and 1),
	CONSTRAINT "week_days_rain_in_range" CHECK("week_days"."rain_millimetres" between 0 and 1000),
	CONSTRAINT "week_days_swimmer_hours_in_range" CHECK("week_days"."swimmer_hours" between 0 and 1000),
	CONSTRAINT "week_days_water_temperature_in_range" CHECK("week_days"."water_temperature_celsius" between -2 and 60),
	CONSTRAINT "week_days_evaporation_in_range" CHECK("week_days"."evaporation_millimetres" between 0 and 50),
	CONSTRAINT "week_days_backwash_in_range" CHECK("week_days"."backwash_cubic_metres" between 0 and 100)
);
