CREATE TRIGGER `events_never_change` BEFORE UPDATE ON `events` BEGIN SELECT RAISE(ABORT, 'events are never changed'); END;
--> statement-breakpoint
CREATE TRIGGER `events_never_go` BEFORE DELETE ON `events` BEGIN SELECT RAISE(ABORT, 'events are never deleted'); END;
--> statement-breakpoint
CREATE TRIGGER `ledger_entries_never_change` BEFORE UPDATE ON `ledger_entries` BEGIN SELECT RAISE(ABORT, 'ledger entries are never changed'); END;
--> statement-breakpoint
CREATE TRIGGER `ledger_entries_never_go` BEFORE DELETE ON `ledger_entries` BEGIN SELECT RAISE(ABORT, 'ledger entries are never deleted'); END;
