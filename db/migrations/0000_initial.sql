CREATE TABLE `accounts` (
	`id` text PRIMARY KEY NOT NULL,
	`email` text,
	`name` text NOT NULL,
	`password_hash` text,
	`is_administrator` integer DEFAULT false NOT NULL,
	`is_engineer` integer DEFAULT false NOT NULL,
	`locale` text DEFAULT 'en' NOT NULL,
	`session_version` integer DEFAULT 1 NOT NULL,
	`created_at` text NOT NULL,
	`closed_at` text
);
--> statement-breakpoint
CREATE UNIQUE INDEX `accounts_email_unique` ON `accounts` (`email`);--> statement-breakpoint
CREATE TABLE `role_grants` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`test` text NOT NULL,
	`account` text NOT NULL,
	`role` text NOT NULL,
	`from_at` text NOT NULL,
	`until_at` text,
	`granted_by` text,
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`account`) REFERENCES `accounts`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`granted_by`) REFERENCES `accounts`(`id`) ON UPDATE no action ON DELETE no action,
	CONSTRAINT "role_grants_in_order" CHECK("role_grants"."until_at" is null or "role_grants"."until_at" >= "role_grants"."from_at")
);
--> statement-breakpoint
CREATE INDEX `role_grants_of_account` ON `role_grants` (`account`,`test`);--> statement-breakpoint
CREATE TABLE `device_holders` (
	`device` text NOT NULL,
	`account` text NOT NULL,
	PRIMARY KEY(`device`, `account`),
	FOREIGN KEY (`device`) REFERENCES `devices`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`account`) REFERENCES `accounts`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `devices` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`account` text NOT NULL,
	`public_key` text,
	`enrolled_at` text NOT NULL,
	`revoked_at` text,
	`last_heard_at` text,
	`holds` integer DEFAULT 0 NOT NULL,
	FOREIGN KEY (`account`) REFERENCES `accounts`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `enrolment_codes` (
	`id` text PRIMARY KEY NOT NULL,
	`code_hash` text NOT NULL,
	`test` text NOT NULL,
	`role` text NOT NULL,
	`person_name` text NOT NULL,
	`account` text,
	`created_at` text NOT NULL,
	`created_by` text NOT NULL,
	`expires_at` text NOT NULL,
	`revoked_at` text,
	`used_at` text,
	`used_by` text,
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`account`) REFERENCES `accounts`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`created_by`) REFERENCES `accounts`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`used_by`) REFERENCES `devices`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE UNIQUE INDEX `enrolment_codes_code_hash_unique` ON `enrolment_codes` (`code_hash`);--> statement-breakpoint
CREATE TABLE `events` (
	`server_seq` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`id` text,
	`device` text NOT NULL,
	`seq` integer,
	`test` text,
	`type` text,
	`basis` text,
	`body` text NOT NULL,
	`body_hash` text NOT NULL,
	`signature` text,
	`sent_by` text NOT NULL,
	`received_at` text NOT NULL,
	`outcome` text NOT NULL,
	`code` text,
	`message` text
);
--> statement-breakpoint
CREATE INDEX `events_id` ON `events` (`id`);--> statement-breakpoint
CREATE INDEX `events_basis` ON `events` (`basis`);--> statement-breakpoint
CREATE INDEX `events_body_hash` ON `events` (`body_hash`);--> statement-breakpoint
CREATE INDEX `events_device_seq` ON `events` (`device`,`seq`);--> statement-breakpoint
CREATE INDEX `events_test` ON `events` (`test`,`type`);--> statement-breakpoint
CREATE TABLE `files` (
	`sha256` text NOT NULL,
	`test` text NOT NULL,
	`of_what` text NOT NULL,
	`type` text NOT NULL,
	`size` integer NOT NULL,
	`name` text,
	`added_at` text NOT NULL,
	`added_by` text,
	PRIMARY KEY(`sha256`, `test`, `of_what`),
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action,
	FOREIGN KEY (`added_by`) REFERENCES `accounts`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `ledger_entries` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`chain` text NOT NULL,
	`seq` integer NOT NULL,
	`test` text,
	`at` text NOT NULL,
	`who` text,
	`role` text,
	`device` text,
	`what` text NOT NULL,
	`before` text,
	`after` text,
	`reason` text,
	`captured_at` text,
	`content_hash` text,
	`previous` text NOT NULL,
	`hash` text NOT NULL
);
--> statement-breakpoint
CREATE UNIQUE INDEX `ledger_chain_seq` ON `ledger_entries` (`chain`,`seq`);--> statement-breakpoint
CREATE TABLE `plan_aboard` (
	`test` text NOT NULL,
	`place_in_list` integer NOT NULL,
	`label` text NOT NULL,
	`mass` real NOT NULL,
	`x` real NOT NULL,
	`y` real NOT NULL,
	`z` real NOT NULL,
	`during` text,
	PRIMARY KEY(`test`, `place_in_list`),
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `plan_hydrometers` (
	`test` text NOT NULL,
	`place_in_list` integer NOT NULL,
	`id` text NOT NULL,
	`scale` text NOT NULL,
	`correction` real,
	`certificate` text,
	PRIMARY KEY(`test`, `id`),
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `plan_items` (
	`test` text NOT NULL,
	`place_in_list` integer NOT NULL,
	`label` text NOT NULL,
	`mass` real NOT NULL,
	`x` real NOT NULL,
	`y` real NOT NULL,
	`z` real NOT NULL,
	`action` text NOT NULL,
	`to_x` real,
	`to_y` real,
	`to_z` real,
	PRIMARY KEY(`test`, `place_in_list`),
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `plan_moves` (
	`test` text NOT NULL,
	`place_in_list` integer NOT NULL,
	`no` integer NOT NULL,
	`session` integer,
	`label` text,
	`positions` text NOT NULL,
	PRIMARY KEY(`test`, `no`),
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `plan_series` (
	`test` text NOT NULL,
	`place_in_list` integer NOT NULL,
	`station` text NOT NULL,
	`no` integer NOT NULL,
	`measure` real,
	PRIMARY KEY(`test`, `station`, `no`),
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `plan_settings` (
	`test` text PRIMARY KEY NOT NULL,
	`settings` text,
	`uncertainty` text,
	`rounds` text NOT NULL,
	`mark_places` text NOT NULL,
	`gas_dangerous` text,
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `plan_stations` (
	`test` text NOT NULL,
	`place_in_list` integer NOT NULL,
	`id` text NOT NULL,
	`instrument` text NOT NULL,
	`x` real,
	`reversed` integer,
	`measure` real,
	`where_in_words` text,
	`scale_from` real,
	`scale_to` real,
	PRIMARY KEY(`test`, `id`),
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `plan_water_places` (
	`test` text NOT NULL,
	`place_in_list` integer NOT NULL,
	`where_in_words` text NOT NULL,
	`depth` real NOT NULL,
	PRIMARY KEY(`test`, `where_in_words`, `depth`),
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `plan_weights` (
	`test` text NOT NULL,
	`place_in_list` integer NOT NULL,
	`id` text NOT NULL,
	`mass` real NOT NULL,
	`certificate` text,
	PRIMARY KEY(`test`, `id`),
	FOREIGN KEY (`test`) REFERENCES `tests`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `placed_events` (
	`event` text PRIMARY KEY NOT NULL,
	`server_seq` integer NOT NULL,
	`test` text NOT NULL,
	`type` text NOT NULL,
	`slot_key` text
);
--> statement-breakpoint
CREATE INDEX `placed_slot` ON `placed_events` (`test`,`slot_key`);--> statement-breakpoint
CREATE INDEX `placed_type` ON `placed_events` (`test`,`type`);--> statement-breakpoint
CREATE TABLE `readings` (
	`event` text PRIMARY KEY NOT NULL,
	`test` text NOT NULL,
	`slot_key` text NOT NULL,
	`reading` text NOT NULL,
	`value` text NOT NULL,
	`source` text NOT NULL,
	`status` text NOT NULL,
	`author` text NOT NULL,
	`device` text NOT NULL,
	`captured_at` text NOT NULL,
	`clock_offset_ms` integer,
	`received_at` text NOT NULL,
	`server_seq` integer NOT NULL,
	`reason` text,
	`corrects` integer NOT NULL
);
--> statement-breakpoint
CREATE INDEX `readings_slot` ON `readings` (`test`,`slot_key`);--> statement-breakpoint
CREATE TABLE `slots` (
	`test` text NOT NULL,
	`slot_key` text NOT NULL,
	`slot` text NOT NULL,
	`state` text NOT NULL,
	`heads` text NOT NULL,
	PRIMARY KEY(`test`, `slot_key`)
);
--> statement-breakpoint
CREATE TABLE `server_identity` (
	`only` integer PRIMARY KEY NOT NULL,
	`id` text NOT NULL,
	`epoch` text NOT NULL,
	`created_at` text NOT NULL,
	`last_opened_at` text NOT NULL,
	CONSTRAINT "server_identity_one_row" CHECK("server_identity"."only" = 1)
);
--> statement-breakpoint
CREATE TABLE `tests` (
	`id` text PRIMARY KEY NOT NULL,
	`title` text NOT NULL,
	`date` text NOT NULL,
	`place` text NOT NULL,
	`note` text,
	`time_zone` text NOT NULL,
	`state` text NOT NULL,
	`custody` text DEFAULT 'here' NOT NULL,
	`vessel` text NOT NULL,
	`vessel_copy` text NOT NULL,
	`created_at` text NOT NULL,
	FOREIGN KEY (`vessel`) REFERENCES `vessels`(`id`) ON UPDATE no action ON DELETE no action
);
--> statement-breakpoint
CREATE TABLE `vessels` (
	`id` text PRIMARY KEY NOT NULL,
	`name` text NOT NULL,
	`hull_number` text,
	`lbp` real NOT NULL,
	`breadth` real NOT NULL,
	`depth` real NOT NULL,
	`hydrostatics` text NOT NULL,
	`draft_marks` text NOT NULL,
	`freeboard_marks` text NOT NULL,
	`tanks` text NOT NULL,
	`previous` text,
	`created_at` text NOT NULL,
	`changed_at` text NOT NULL
);
