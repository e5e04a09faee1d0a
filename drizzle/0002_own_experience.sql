CREATE TABLE `confirmations` (
	`id` text PRIMARY KEY NOT NULL,
	`check_id` text NOT NULL,
	`person_id` text NOT NULL,
	`at` integer NOT NULL,
	`kind` text NOT NULL,
	`finding_code` text NOT NULL,
	`finding_pins` text,
	`proof` text NOT NULL,
	`counts_kind` integer NOT NULL,
	`withdrawn_at` integer,
	`withdrawn_by` text,
	FOREIGN KEY (`check_id`) REFERENCES `checks`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`withdrawn_by`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `confirmations_in_force` ON `confirmations` (`check_id`) WHERE withdrawn_at IS NULL;--> statement-breakpoint
CREATE INDEX `confirmations_check` ON `confirmations` (`check_id`,`id`);--> statement-breakpoint
CREATE TABLE `experience_states` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`at` integer NOT NULL,
	`person_id` text NOT NULL,
	`in_use` integer NOT NULL,
	`counts` text,
	FOREIGN KEY (`person_id`) REFERENCES `people`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE INDEX `experience_states_at` ON `experience_states` (`at`);