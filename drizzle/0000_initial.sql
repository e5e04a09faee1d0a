CREATE TABLE `entries` (
	`id` text PRIMARY KEY NOT NULL,
	`slug` text NOT NULL,
	`current_version_id` text,
	`created_at` integer NOT NULL,
	`retired_at` integer
);
--> statement-breakpoint
CREATE UNIQUE INDEX `entries_slug_unique` ON `entries` (`slug`);--> statement-breakpoint
CREATE TABLE `entry_versions` (
	`id` text PRIMARY KEY NOT NULL,
	`entry_id` text NOT NULL,
	`version` integer NOT NULL,
	`published_by` text NOT NULL,
	`published_at` integer NOT NULL,
	`name` text NOT NULL,
	`kind` text NOT NULL,
	`maker` text NOT NULL,
	`quantity` text NOT NULL,
	`connector_shape` text NOT NULL,
	`supply` text NOT NULL,
	`colours` text NOT NULL,
	`search_text` text NOT NULL,
	`data` text NOT NULL,
	FOREIGN KEY (`entry_id`) REFERENCES `entries`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`published_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `entry_versions_number` ON `entry_versions` (`entry_id`,`version`);--> statement-breakpoint
CREATE INDEX `entry_versions_kind` ON `entry_versions` (`kind`);--> statement-breakpoint
CREATE TABLE `check_steps` (
	`id` text PRIMARY KEY NOT NULL,
	`check_id` text NOT NULL,
	`at` integer NOT NULL,
	`received_at` integer NOT NULL,
	`step` text NOT NULL,
	FOREIGN KEY (`check_id`) REFERENCES `checks`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `check_steps_check` ON `check_steps` (`check_id`,`id`);--> statement-breakpoint
CREATE TABLE `checks` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`entry_id` text,
	`entry_version_id` text,
	`machine_id` text,
	`meter_id` text,
	`recheck_of` text,
	`state` text NOT NULL,
	`setup` text NOT NULL,
	`started_at` integer NOT NULL,
	`finished_at` integer,
	`verdict` text,
	`kind` text,
	`finding_code` text,
	`finding_chance` real,
	`sentence` text,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`entry_id`) REFERENCES `entries`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`entry_version_id`) REFERENCES `entry_versions`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`machine_id`) REFERENCES `machines`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`meter_id`) REFERENCES `meters`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `checks_started` ON `checks` (`started_at`,`id`);--> statement-breakpoint
CREATE INDEX `checks_person` ON `checks` (`person_id`,`started_at`);--> statement-breakpoint
CREATE INDEX `checks_machine` ON `checks` (`machine_id`,`started_at`);--> statement-breakpoint
CREATE INDEX `checks_entry` ON `checks` (`entry_id`,`started_at`);--> statement-breakpoint
CREATE INDEX `checks_kind` ON `checks` (`kind`,`started_at`);--> statement-breakpoint
CREATE INDEX `checks_finding` ON `checks` (`finding_code`,`started_at`);--> statement-breakpoint
CREATE INDEX `checks_recheck` ON `checks` (`recheck_of`);--> statement-breakpoint
CREATE TABLE `machines` (
	`id` text PRIMARY KEY NOT NULL,
	`fleet_number` text NOT NULL,
	`name` text NOT NULL,
	`type` text NOT NULL,
	`site` text NOT NULL,
	`battery_volts` real NOT NULL,
	`note` text DEFAULT '' NOT NULL,
	`created_at` integer NOT NULL,
	`retired_at` integer
);
--> statement-breakpoint
CREATE UNIQUE INDEX `machines_fleet_number_unique` ON `machines` (`fleet_number`);--> statement-breakpoint
CREATE TABLE `meters` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`spec` text NOT NULL,
	`created_at` integer NOT NULL,
	`retired_at` integer
);
--> statement-breakpoint
CREATE TABLE `audit_rows` (
	`id` text PRIMARY KEY NOT NULL,
	`at` integer NOT NULL,
	`person_id` text,
	`verb` text NOT NULL,
	`subject_type` text NOT NULL,
	`subject_id` text NOT NULL,
	`detail` text NOT NULL,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `audit_subject` ON `audit_rows` (`subject_type`,`subject_id`);--> statement-breakpoint
CREATE INDEX `audit_at` ON `audit_rows` (`at`);--> statement-breakpoint
CREATE TABLE `people` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text NOT NULL,
	`name` text NOT NULL,
	`password_hash` text NOT NULL,
	`roles` text NOT NULL,
	`created_at` integer NOT NULL,
	`disabled_at` integer
);
--> statement-breakpoint
CREATE UNIQUE INDEX `people_email_unique` ON `people` (`email`);--> statement-breakpoint
CREATE TABLE `rate_limits` (
	`key` text PRIMARY KEY NOT NULL,
	`points` integer NOT NULL,
	`expires_at` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `rate_limits_expiry` ON `rate_limits` (`expires_at`);--> statement-breakpoint
CREATE TABLE `sessions` (
	`id` text PRIMARY KEY NOT NULL,
	`person_id` text NOT NULL,
	`user_agent` text NOT NULL,
	`created_at` integer NOT NULL,
	`last_seen_at` integer NOT NULL,
	`expires_at` integer NOT NULL,
	`revoked_at` integer,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `sessions_person` ON `sessions` (`person_id`);