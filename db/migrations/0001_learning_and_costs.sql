CREATE TABLE `deferral` (
	`id` text PRIMARY KEY NOT NULL,
	`home_id` text NOT NULL,
	`wall_id` text NOT NULL,
	`kind` text NOT NULL,
	`work_key` text NOT NULL,
	`from_opens_on` text NOT NULL,
	`not_before` text NOT NULL,
	`created_by` text,
	`created_at` integer NOT NULL,
	`withdrawn_at` integer,
	`withdrawn_by` text,
	FOREIGN KEY (`home_id`) REFERENCES `home`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`wall_id`) REFERENCES `wall`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`created_by`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`withdrawn_by`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE set null
);
--> statement-breakpoint
CREATE INDEX `deferral_home` ON `deferral` (`home_id`);--> statement-breakpoint
CREATE UNIQUE INDEX `deferral_once` ON `deferral` (`work_key`,`from_opens_on`) WHERE withdrawn_at is null;--> statement-breakpoint
CREATE TABLE `finding` (
	`id` text PRIMARY KEY NOT NULL,
	`work_record_id` text NOT NULL,
	`wall_id` text NOT NULL,
	`coat` text,
	`seal` text,
	`answers` text,
	FOREIGN KEY (`work_record_id`) REFERENCES `work_record`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`wall_id`) REFERENCES `wall`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `finding_once` ON `finding` (`work_record_id`,`wall_id`);--> statement-breakpoint
CREATE INDEX `finding_wall` ON `finding` (`wall_id`);--> statement-breakpoint
CREATE TABLE `home_cost` (
	`home_id` text PRIMARY KEY NOT NULL,
	`doer` text NOT NULL,
	`trip_cents` integer NOT NULL,
	`restain_cents_per_m2` real NOT NULL,
	`strip_cents_per_m2` real NOT NULL,
	`recaulk_cents_per_m` real NOT NULL,
	`wash_cents_per_m2` real NOT NULL,
	`set_by` text,
	`set_at` integer NOT NULL,
	FOREIGN KEY (`home_id`) REFERENCES `home`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`set_by`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE set null,
	CONSTRAINT "home_cost_amounts" CHECK("home_cost"."trip_cents" >= 0 and "home_cost"."restain_cents_per_m2" >= 0 and "home_cost"."strip_cents_per_m2" >= 0 and "home_cost"."recaulk_cents_per_m" >= 0 and "home_cost"."wash_cents_per_m2" >= 0)
);
--> statement-breakpoint
ALTER TABLE `home` ADD `grouping` text;--> statement-breakpoint
ALTER TABLE `wall` ADD `cover` text DEFAULT 'none' NOT NULL;--> statement-breakpoint
ALTER TABLE `wall` ADD `cover_depth_m` real DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `wall` ADD `cover_height_m` real DEFAULT 0 NOT NULL;--> statement-breakpoint
ALTER TABLE `wall` ADD `cover_share` real DEFAULT 1 NOT NULL;--> statement-breakpoint
ALTER TABLE `wall` ADD `corners` integer DEFAULT 2 NOT NULL;--> statement-breakpoint
ALTER TABLE `wall` ADD `pipes` integer DEFAULT 0 NOT NULL;--> statement-breakpoint
UPDATE `wall_plan` SET `coat` = json_set(`coat`, '$.factor', 1, '$.learned', json('[]'), '$.assumed', json('false'), '$.found', null), `seal` = json_set(`seal`, '$.factor', 1, '$.learned', json('[]'), '$.assumed', json('false'), '$.found', null);--> statement-breakpoint
UPDATE `home` SET `replan_on` = '2000-01-01' WHERE `planned_at` IS NOT NULL;
