CREATE TABLE `backups` (
	`id` integer PRIMARY KEY AUTOINCREMENT NOT NULL,
	`at` text NOT NULL,
	`file` text NOT NULL,
	`bytes` integer NOT NULL,
	`server_seq` integer NOT NULL,
	`ledger_entry` integer NOT NULL
);
