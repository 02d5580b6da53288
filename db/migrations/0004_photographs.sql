CREATE TABLE `event_photographs` (
	`sha256` text NOT NULL,
	`server_seq` integer NOT NULL,
	`event` text NOT NULL,
	`test` text NOT NULL,
	`author` text NOT NULL,
	PRIMARY KEY(`sha256`, `server_seq`)
);
--> statement-breakpoint
CREATE INDEX `event_photographs_event` ON `event_photographs` (`test`,`event`);