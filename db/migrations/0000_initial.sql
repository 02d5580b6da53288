CREATE TABLE `server_identity` (
	`only` integer PRIMARY KEY NOT NULL,
	`id` text NOT NULL,
	`epoch` text NOT NULL,
	`created_at` text NOT NULL,
	`last_opened_at` text NOT NULL,
	CONSTRAINT "server_identity_one_row" CHECK("server_identity"."only" = 1)
);
