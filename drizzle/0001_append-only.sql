-- What was written down stays as it was: history and promises may be added to, never rewritten. Only the references to
-- people are left free, so that a deleted account becomes null; deleting a whole household still takes its rows along.
CREATE TRIGGER `audit_trail_is_append_only` BEFORE UPDATE OF `household_id`, `at`, `action`, `subject_id`, `detail` ON `audit_trail`
BEGIN SELECT RAISE(ABORT, 'audit_trail is append-only'); END;
--> statement-breakpoint
CREATE TRIGGER `dose_events_are_append_only` BEFORE UPDATE OF `id`, `household_id`, `dose_id`, `action`, `status_from`, `status_to`, `amount_from`, `amount_to`, `given_at_from`, `given_at_to`, `plan_version_seen`, `created_at` ON `dose_events`
BEGIN SELECT RAISE(ABORT, 'dose_events is append-only'); END;
--> statement-breakpoint
CREATE TRIGGER `reading_versions_are_append_only` BEFORE UPDATE OF `reading_id`, `replaced_at`, `former` ON `reading_versions`
BEGIN SELECT RAISE(ABORT, 'reading_versions is append-only'); END;
--> statement-breakpoint
CREATE TRIGGER `plans_keep_what_they_promised` BEFORE UPDATE OF `id`, `household_id`, `version`, `engine_version`, `input_hash`, `reading_id`, `taken_at`, `ends_at`, `created_at`, `snapshot`, `result` ON `plans`
BEGIN SELECT RAISE(ABORT, 'a stored plan keeps what it promised'); END;
--> statement-breakpoint
CREATE TRIGGER `a_household_keeps_an_owner_on_change` BEFORE UPDATE OF `role`, `valid_until` ON `memberships`
WHEN OLD.`role` = 'owner' AND OLD.`valid_until` IS NULL AND (NEW.`role` <> 'owner' OR NEW.`valid_until` IS NOT NULL)
  AND NOT EXISTS (SELECT 1 FROM `memberships` WHERE `household_id` = OLD.`household_id` AND `id` <> OLD.`id` AND `role` = 'owner' AND `valid_until` IS NULL)
BEGIN SELECT RAISE(ABORT, 'the last owner cannot leave or be demoted'); END;
