CREATE TABLE `account` (
	`user_id` text NOT NULL,
	`type` text NOT NULL,
	`provider` text NOT NULL,
	`provider_account_id` text NOT NULL,
	`refresh_token` text,
	`access_token` text,
	`expires_at` integer,
	`token_type` text,
	`scope` text,
	`id_token` text,
	`session_state` text,
	PRIMARY KEY(`provider`, `provider_account_id`),
	FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE TABLE `account_token` (
	`token_hash` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`purpose` text NOT NULL,
	`expires_at` integer NOT NULL,
	`used_at` integer,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `account_token_user` ON `account_token` (`user_id`);--> statement-breakpoint
CREATE TABLE `session` (
	`session_token` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`expires` integer NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE TABLE `user` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text,
	`email` text NOT NULL,
	`email_verified` integer,
	`image` text,
	`password_hash` text,
	`role` text DEFAULT 'homeowner' NOT NULL,
	`company` text,
	`units` text DEFAULT 'us' NOT NULL,
	`reminders_on` integer DEFAULT true NOT NULL,
	`sessions_valid_from` integer,
	`created_at` integer NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `user_email_unique` ON `user` (`email`);--> statement-breakpoint
CREATE TABLE `verification_token` (
	`identifier` text NOT NULL,
	`token` text NOT NULL,
	`expires` integer NOT NULL,
	PRIMARY KEY(`identifier`, `token`)
);
--> statement-breakpoint
CREATE TABLE `home` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`postal_code` text NOT NULL,
	`place` text NOT NULL,
	`state` text NOT NULL,
	`county` text NOT NULL,
	`county_fips` text NOT NULL,
	`latitude` real NOT NULL,
	`longitude` real NOT NULL,
	`elevation_m` real,
	`time_zone` text NOT NULL,
	`climate_zone` text,
	`climate_zone_override` text,
	`station_id` text NOT NULL,
	`compass_deg` real DEFAULT 0 NOT NULL,
	`wood` text DEFAULT 'other' NOT NULL,
	`siding_nominal_in` integer DEFAULT 8 NOT NULL,
	`crown_height_m` real DEFAULT 0.0254 NOT NULL,
	`year_built` integer,
	`created_by` text,
	`created_at` integer NOT NULL,
	`revision` integer DEFAULT 1 NOT NULL,
	`planned_at` integer,
	`replan_on` text,
	`archived_at` integer,
	FOREIGN KEY (`created_by`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "home_latitude" CHECK("home"."latitude" between -90 and 90),
	CONSTRAINT "home_longitude" CHECK("home"."longitude" between -180 and 180)
);
--> statement-breakpoint
CREATE INDEX `home_replan` ON `home` (`replan_on`);--> statement-breakpoint
CREATE TABLE `home_member` (
	`home_id` text NOT NULL,
	`user_id` text NOT NULL,
	`membership` text NOT NULL,
	`added_by` text,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`home_id`, `user_id`),
	FOREIGN KEY (`home_id`) REFERENCES `home`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`added_by`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `home_member_user` ON `home_member` (`user_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `home_one_owner` ON `home_member` (`home_id`) WHERE membership = 'owner';--> statement-breakpoint
CREATE TABLE `opening` (
	`id` text PRIMARY KEY NOT NULL,
	`wall_id` text NOT NULL,
	`kind` text NOT NULL,
	`width_m` real NOT NULL,
	`height_m` real NOT NULL,
	`count` integer DEFAULT 1 NOT NULL,
	FOREIGN KEY (`wall_id`) REFERENCES `wall`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "opening_size" CHECK("opening"."width_m" > 0 and "opening"."height_m" > 0 and "opening"."count" between 1 and 50)
);
--> statement-breakpoint
CREATE INDEX `opening_wall` ON `opening` (`wall_id`);--> statement-breakpoint
CREATE TABLE `postal_code` (
	`code` text PRIMARY KEY NOT NULL,
	`place` text NOT NULL,
	`state` text NOT NULL,
	`county` text NOT NULL,
	`county_fips` text NOT NULL,
	`latitude` real NOT NULL,
	`longitude` real NOT NULL
);
--> statement-breakpoint
CREATE TABLE `wall` (
	`id` text PRIMARY KEY NOT NULL,
	`home_id` text NOT NULL,
	`position` integer NOT NULL,
	`name` text NOT NULL,
	`azimuth_deg` real NOT NULL,
	`width_m` real NOT NULL,
	`height_m` real NOT NULL,
	`gable_height_m` real DEFAULT 0 NOT NULL,
	`eave_depth_m` real DEFAULT 0.45 NOT NULL,
	`eave_drop_m` real DEFAULT 0 NOT NULL,
	`shade` text DEFAULT 'open' NOT NULL,
	`shade_height_deg` real DEFAULT 0 NOT NULL,
	`weather_side` integer DEFAULT false NOT NULL,
	`finish` text DEFAULT 'semitransparent' NOT NULL,
	`stain_base` text DEFAULT 'oil' NOT NULL,
	`color_hex` text DEFAULT '#8A5A32' NOT NULL,
	`color_name` text,
	`texture` text DEFAULT 'smooth' NOT NULL,
	`sealant` text DEFAULT 'acrylic-latex' NOT NULL,
	`created_at` integer NOT NULL,
	`removed_at` integer,
	FOREIGN KEY (`home_id`) REFERENCES `home`(`id`) ON UPDATE no action ON DELETE cascade,
	CONSTRAINT "wall_azimuth" CHECK("wall"."azimuth_deg" >= 0 and "wall"."azimuth_deg" < 360),
	CONSTRAINT "wall_size" CHECK("wall"."width_m" > 0 and "wall"."height_m" > 0 and "wall"."gable_height_m" >= 0 and "wall"."eave_depth_m" >= 0 and "wall"."eave_drop_m" >= 0)
);
--> statement-breakpoint
CREATE INDEX `wall_home` ON `wall` (`home_id`,`position`);--> statement-breakpoint
CREATE TABLE `wall_exposure` (
	`wall_id` text PRIMARY KEY NOT NULL,
	`sun_hours` real NOT NULL,
	`sun_hours_monthly` text NOT NULL,
	`dose_kwh_m2` real NOT NULL,
	`dose_monthly` text NOT NULL,
	`inputs` text NOT NULL,
	`computed_at` integer NOT NULL,
	FOREIGN KEY (`wall_id`) REFERENCES `wall`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE TABLE `care_rule` (
	`wall_id` text NOT NULL,
	`kind` text NOT NULL,
	`rule` text NOT NULL,
	`start_on` text NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	PRIMARY KEY(`wall_id`, `kind`),
	FOREIGN KEY (`wall_id`) REFERENCES `wall`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE TABLE `wall_plan` (
	`wall_id` text PRIMARY KEY NOT NULL,
	`coat` text NOT NULL,
	`seal` text NOT NULL,
	FOREIGN KEY (`wall_id`) REFERENCES `wall`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE TABLE `work_item` (
	`wall_id` text NOT NULL,
	`kind` text NOT NULL,
	`home_id` text NOT NULL,
	`rule` text,
	`start_on` text,
	`due_on` text NOT NULL,
	`opens_on` text NOT NULL,
	`closes_on` text NOT NULL,
	`moved` text NOT NULL,
	`missed_on` text,
	`lapses_on` text,
	`remind_on` text,
	`basis` text NOT NULL,
	`life_months` integer,
	`because` text NOT NULL,
	`explanation` text NOT NULL,
	PRIMARY KEY(`wall_id`, `kind`),
	FOREIGN KEY (`wall_id`) REFERENCES `wall`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`home_id`) REFERENCES `home`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `work_item_home` ON `work_item` (`home_id`);--> statement-breakpoint
CREATE INDEX `work_item_opens` ON `work_item` (`opens_on`);--> statement-breakpoint
CREATE INDEX `work_item_remind` ON `work_item` (`remind_on`);--> statement-breakpoint
CREATE TABLE `work_record` (
	`id` text PRIMARY KEY NOT NULL,
	`home_id` text NOT NULL,
	`kind` text NOT NULL,
	`done_on` text NOT NULL,
	`origin` text NOT NULL,
	`product` text,
	`amount_l` real,
	`cost_cents` integer,
	`note` text,
	`finish` text,
	`stain_base` text,
	`color_hex` text,
	`sealant` text,
	`submission_key` text NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	`removed_at` integer,
	`removed_by` text,
	FOREIGN KEY (`home_id`) REFERENCES `home`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`removed_by`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "work_record_day" CHECK("work_record"."done_on" glob '[12][0-9][0-9][0-9]-[01][0-9]-[0-3][0-9]'),
	CONSTRAINT "work_record_amounts" CHECK(("work_record"."amount_l" is null or "work_record"."amount_l" >= 0) and ("work_record"."cost_cents" is null or "work_record"."cost_cents" >= 0))
);
--> statement-breakpoint
CREATE UNIQUE INDEX `work_record_submission_key_unique` ON `work_record` (`submission_key`);--> statement-breakpoint
CREATE INDEX `work_record_home` ON `work_record` (`home_id`,`done_on`);--> statement-breakpoint
CREATE TABLE `work_record_wall` (
	`work_record_id` text NOT NULL,
	`wall_id` text NOT NULL,
	PRIMARY KEY(`work_record_id`, `wall_id`),
	FOREIGN KEY (`work_record_id`) REFERENCES `work_record`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`wall_id`) REFERENCES `wall`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `work_record_wall_wall` ON `work_record_wall` (`wall_id`);--> statement-breakpoint
CREATE TABLE `delivery` (
	`id` text PRIMARY KEY NOT NULL,
	`key` text NOT NULL,
	`home_id` text NOT NULL,
	`user_id` text NOT NULL,
	`wall_id` text NOT NULL,
	`kind` text NOT NULL,
	`stage` text NOT NULL,
	`work_key` text NOT NULL,
	`due_on` text NOT NULL,
	`mail_id` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`home_id`) REFERENCES `home`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`wall_id`) REFERENCES `wall`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`mail_id`) REFERENCES `mail`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `delivery_key_unique` ON `delivery` (`key`);--> statement-breakpoint
CREATE INDEX `delivery_mail` ON `delivery` (`mail_id`);--> statement-breakpoint
CREATE INDEX `delivery_home` ON `delivery` (`home_id`);--> statement-breakpoint
CREATE TABLE `job_run` (
	`id` text PRIMARY KEY NOT NULL,
	`job` text NOT NULL,
	`started_at` integer NOT NULL,
	`finished_at` integer,
	`outcome` text,
	`error` text
);
--> statement-breakpoint
CREATE INDEX `job_run_started` ON `job_run` (`started_at`);--> statement-breakpoint
CREATE TABLE `mail` (
	`id` text PRIMARY KEY NOT NULL,
	`kind` text NOT NULL,
	`idempotency_key` text NOT NULL,
	`to_address` text NOT NULL,
	`user_id` text,
	`home_id` text,
	`props` text NOT NULL,
	`message_id` text NOT NULL,
	`subject` text,
	`state` text DEFAULT 'queued' NOT NULL,
	`attempts` integer DEFAULT 0 NOT NULL,
	`next_attempt_at` integer NOT NULL,
	`lease_token` text,
	`lease_until` integer,
	`sent_at` integer,
	`last_error` text,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`home_id`) REFERENCES `home`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `mail_idempotency_key_unique` ON `mail` (`idempotency_key`);--> statement-breakpoint
CREATE UNIQUE INDEX `mail_message_id_unique` ON `mail` (`message_id`);--> statement-breakpoint
CREATE INDEX `mail_open` ON `mail` (`next_attempt_at`) WHERE state in ('queued', 'sending');--> statement-breakpoint
CREATE INDEX `mail_created` ON `mail` (`created_at`);