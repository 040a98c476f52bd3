CREATE TABLE `audit_event` (
	`id` text PRIMARY KEY NOT NULL,
	`actor_id` text,
	`via` text NOT NULL,
	`home_id` text,
	`event` text NOT NULL,
	`subject_id` text,
	`detail` text,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`actor_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE set null,
	FOREIGN KEY (`home_id`) REFERENCES `home`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE INDEX `audit_home` ON `audit_event` (`home_id`,`created_at`);--> statement-breakpoint
CREATE INDEX `audit_actor` ON `audit_event` (`actor_id`);--> statement-breakpoint
CREATE TABLE `bounce` (
	`id` text PRIMARY KEY NOT NULL,
	`mail_id` text,
	`address` text NOT NULL,
	`is_permanent` integer NOT NULL,
	`status` text,
	`detail` text,
	`report_key` text NOT NULL,
	`created_at` integer NOT NULL,
	FOREIGN KEY (`mail_id`) REFERENCES `mail`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `bounce_report_key_unique` ON `bounce` (`report_key`);--> statement-breakpoint
CREATE INDEX `bounce_mail` ON `bounce` (`mail_id`);--> statement-breakpoint
CREATE INDEX `bounce_address` ON `bounce` (`address`);--> statement-breakpoint
CREATE TABLE `reminder_stop` (
	`id` text PRIMARY KEY NOT NULL,
	`user_id` text NOT NULL,
	`home_id` text NOT NULL,
	`wall_id` text NOT NULL,
	`kind` text NOT NULL,
	`work_key` text NOT NULL,
	`created_at` integer NOT NULL,
	`withdrawn_at` integer,
	FOREIGN KEY (`user_id`) REFERENCES `user`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`home_id`) REFERENCES `home`(`id`) ON UPDATE no action ON DELETE cascade,
	FOREIGN KEY (`wall_id`) REFERENCES `wall`(`id`) ON UPDATE no action ON DELETE cascade
);
--> statement-breakpoint
CREATE UNIQUE INDEX `reminder_stop_once` ON `reminder_stop` (`user_id`,`work_key`) WHERE withdrawn_at is null;--> statement-breakpoint
CREATE INDEX `reminder_stop_home` ON `reminder_stop` (`home_id`);--> statement-breakpoint
ALTER TABLE `user` ADD `bounced_at` integer;--> statement-breakpoint
ALTER TABLE `home_member` ADD `reminders_stopped_at` integer;