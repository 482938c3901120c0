-- The schema that the migrations make. Written by npm run db:migrate -- --dump; do not edit.
SET FOREIGN_KEY_CHECKS = 0;

CREATE TABLE `account_tokens` (
  `hash` char(64) NOT NULL,
  `purpose` varchar(16) NOT NULL,
  `user_id` varchar(32) DEFAULT NULL,
  `address` varchar(254) NOT NULL,
  `detail` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL CHECK (json_valid(`detail`)),
  `created_at` datetime(3) NOT NULL,
  `expires_at` datetime(3) NOT NULL,
  PRIMARY KEY (`hash`),
  KEY `expiry` (`expires_at`),
  KEY `of_user` (`user_id`,`purpose`),
  CONSTRAINT `account_tokens_user` FOREIGN KEY (`user_id`) REFERENCES `users` (`id`) ON DELETE CASCADE
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `audit` (
  `number` int(10) unsigned NOT NULL,
  `hash_before` char(64) NOT NULL,
  `hash` char(64) NOT NULL,
  `actor` varchar(32) DEFAULT NULL,
  `action` varchar(64) NOT NULL,
  `subject_kind` varchar(32) NOT NULL,
  `subject_id` varchar(96) NOT NULL,
  `detail` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL CHECK (json_valid(`detail`)),
  `at` datetime(3) NOT NULL,
  PRIMARY KEY (`number`),
  UNIQUE KEY `one_after` (`hash_before`),
  UNIQUE KEY `hash` (`hash`),
  KEY `of_subject` (`subject_kind`,`subject_id`),
  KEY `audit_actor` (`actor`),
  CONSTRAINT `audit_actor` FOREIGN KEY (`actor`) REFERENCES `users` (`id`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `citations` (
  `row_key` varchar(80) NOT NULL,
  `version` int(10) unsigned NOT NULL,
  `position` smallint(5) unsigned NOT NULL,
  `source` varchar(80) NOT NULL,
  `stance` enum('for','against') NOT NULL,
  `read` enum('whole','page','excerpt','title') DEFAULT NULL,
  `locator` varchar(200) NOT NULL,
  `quotation` varchar(400) NOT NULL,
  `seen_on` date DEFAULT NULL,
  PRIMARY KEY (`row_key`,`version`,`position`),
  KEY `source` (`source`),
  CONSTRAINT `citations_row` FOREIGN KEY (`row_key`, `version`) REFERENCES `reference_rows` (`row_key`, `version`),
  CONSTRAINT `citations_source` FOREIGN KEY (`source`) REFERENCES `sources` (`source_key`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `claims` (
  `claim_key` varchar(80) NOT NULL,
  `version` int(10) unsigned NOT NULL,
  `maker` varchar(16) NOT NULL,
  `table_name` varchar(32) NOT NULL,
  `division` varchar(400) NOT NULL,
  `line` varchar(400) NOT NULL,
  `years_from` smallint(5) unsigned DEFAULT NULL,
  `years_to` smallint(5) unsigned DEFAULT NULL,
  `source` varchar(80) NOT NULL,
  `note` varchar(600) NOT NULL,
  `edition_from` int(10) unsigned NOT NULL,
  `edition_to` int(10) unsigned DEFAULT NULL,
  `live_key` varchar(80) GENERATED ALWAYS AS (case when `edition_to` is null then `claim_key` end) VIRTUAL,
  PRIMARY KEY (`claim_key`,`version`),
  UNIQUE KEY `one_live` (`live_key`),
  KEY `source` (`source`),
  KEY `claims_from` (`edition_from`),
  KEY `claims_to` (`edition_to`),
  CONSTRAINT `claims_from` FOREIGN KEY (`edition_from`) REFERENCES `editions` (`number`),
  CONSTRAINT `claims_source` FOREIGN KEY (`source`) REFERENCES `sources` (`source_key`),
  CONSTRAINT `claims_to` FOREIGN KEY (`edition_to`) REFERENCES `editions` (`number`),
  CONSTRAINT `claims_span` CHECK (`edition_to` > `edition_from`),
  CONSTRAINT `claims_years` CHECK (`years_from` is null = (`years_to` is null) and (`years_from` is null or `years_from` <= `years_to`))
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `editions` (
  `number` int(10) unsigned NOT NULL,
  `parent` int(10) unsigned DEFAULT NULL,
  `digest` char(64) NOT NULL,
  `cause` enum('release','correction','undo') NOT NULL,
  `cause_id` varchar(64) DEFAULT NULL,
  `credits` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin DEFAULT NULL CHECK (json_valid(`credits`)),
  `made_at` datetime(3) NOT NULL,
  PRIMARY KEY (`number`),
  UNIQUE KEY `one_child` (`parent`),
  CONSTRAINT `editions_parent` FOREIGN KEY (`parent`) REFERENCES `editions` (`number`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `edition_counter` (
  `id` tinyint(3) unsigned NOT NULL,
  `number` int(10) unsigned NOT NULL,
  PRIMARY KEY (`id`),
  CONSTRAINT `one_row` CHECK (`id` = 1)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `files` (
  `id` varchar(32) NOT NULL,
  `owner` varchar(32) DEFAULT NULL,
  `name` varchar(200) CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci NOT NULL DEFAULT '',
  `state` enum('arriving','checking','ready','refused') NOT NULL DEFAULT 'arriving',
  `refusal` varchar(32) DEFAULT NULL,
  `storage_key` varchar(160) NOT NULL,
  `media_type` varchar(100) DEFAULT NULL,
  `bytes` int(10) unsigned DEFAULT NULL,
  `received` int(10) unsigned NOT NULL DEFAULT 0,
  `kept_bytes` int(10) unsigned DEFAULT NULL,
  `sha256` char(64) DEFAULT NULL,
  `width` smallint(5) unsigned DEFAULT NULL,
  `height` smallint(5) unsigned DEFAULT NULL,
  `taken_at` varchar(32) DEFAULT NULL,
  `created_at` datetime(3) NOT NULL,
  `touched_at` datetime(3) DEFAULT NULL,
  `deleted_at` datetime(3) DEFAULT NULL,
  PRIMARY KEY (`id`),
  UNIQUE KEY `storage_key` (`storage_key`),
  KEY `files_of_owner` (`owner`,`created_at`),
  KEY `unfinished` (`state`,`touched_at`),
  KEY `to_remove` (`deleted_at`),
  CONSTRAINT `files_owner` FOREIGN KEY (`owner`) REFERENCES `users` (`id`) ON DELETE SET NULL
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `file_pieces` (
  `file_id` varchar(32) NOT NULL,
  `at_byte` int(10) unsigned NOT NULL,
  `bytes` int(10) unsigned NOT NULL,
  `object_key` varchar(160) NOT NULL,
  PRIMARY KEY (`file_id`,`at_byte`),
  CONSTRAINT `file_pieces_file` FOREIGN KEY (`file_id`) REFERENCES `files` (`id`) ON DELETE CASCADE
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `jobs` (
  `id` varchar(32) NOT NULL,
  `kind` varchar(64) NOT NULL,
  `payload` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL CHECK (json_valid(`payload`)),
  `user_id` varchar(32) DEFAULT NULL,
  `once_key` varchar(160) DEFAULT NULL,
  `state` enum('due','running','done','failed','stopped') NOT NULL DEFAULT 'due',
  `due_at` datetime(3) NOT NULL,
  `taken_by` varchar(64) DEFAULT NULL,
  `taken_until` datetime(3) DEFAULT NULL,
  `attempts` smallint(5) unsigned NOT NULL DEFAULT 0,
  `progress` int(10) unsigned NOT NULL DEFAULT 0,
  `total` int(10) unsigned DEFAULT NULL,
  `checkpoint` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin DEFAULT NULL CHECK (json_valid(`checkpoint`)),
  `stop_asked_at` datetime(3) DEFAULT NULL,
  `last_error` varchar(500) DEFAULT NULL,
  `created_at` datetime(3) NOT NULL,
  `finished_at` datetime(3) DEFAULT NULL,
  PRIMARY KEY (`id`),
  UNIQUE KEY `once` (`once_key`),
  KEY `next_due` (`state`,`due_at`),
  KEY `of_user` (`user_id`,`created_at`),
  CONSTRAINT `jobs_user` FOREIGN KEY (`user_id`) REFERENCES `users` (`id`) ON DELETE CASCADE
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `notices` (
  `id` varchar(32) NOT NULL,
  `user_id` varchar(32) NOT NULL,
  `kind` varchar(32) NOT NULL,
  `template` varchar(64) NOT NULL,
  `data` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL CHECK (json_valid(`data`)),
  `mail` enum('each','digest','off') NOT NULL,
  `created_at` datetime(3) NOT NULL,
  `read_at` datetime(3) DEFAULT NULL,
  `archived_at` datetime(3) DEFAULT NULL,
  `digested_at` datetime(3) DEFAULT NULL,
  PRIMARY KEY (`id`),
  KEY `of_user` (`user_id`,`archived_at`,`created_at`),
  KEY `for_digest` (`mail`,`digested_at`,`user_id`),
  CONSTRAINT `notices_user` FOREIGN KEY (`user_id`) REFERENCES `users` (`id`) ON DELETE CASCADE
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `notice_preferences` (
  `user_id` varchar(32) NOT NULL,
  `kind` varchar(32) NOT NULL,
  `mail` enum('each','digest','off') NOT NULL,
  PRIMARY KEY (`user_id`,`kind`),
  CONSTRAINT `notice_preferences_user` FOREIGN KEY (`user_id`) REFERENCES `users` (`id`) ON DELETE CASCADE
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `outbox` (
  `id` varchar(32) NOT NULL,
  `user_id` varchar(32) DEFAULT NULL,
  `recipient` varchar(254) NOT NULL,
  `kind` varchar(64) NOT NULL,
  `message_id` varchar(320) NOT NULL DEFAULT '',
  `subject` varchar(300) NOT NULL,
  `body_text` mediumtext NOT NULL,
  `body_html` mediumtext DEFAULT NULL,
  `unsubscribe_url` varchar(500) DEFAULT NULL,
  `once_key` varchar(160) DEFAULT NULL,
  `created_at` datetime(3) NOT NULL,
  `due_at` datetime(3) NOT NULL,
  `taken_by` varchar(64) DEFAULT NULL,
  `taken_until` datetime(3) DEFAULT NULL,
  `attempts` smallint(5) unsigned NOT NULL DEFAULT 0,
  `last_error` varchar(500) DEFAULT NULL,
  `sent_at` datetime(3) DEFAULT NULL,
  `failed_at` datetime(3) DEFAULT NULL,
  PRIMARY KEY (`id`),
  UNIQUE KEY `once` (`once_key`),
  KEY `to_send` (`sent_at`,`due_at`),
  KEY `outbox_user` (`user_id`),
  CONSTRAINT `outbox_user` FOREIGN KEY (`user_id`) REFERENCES `users` (`id`) ON DELETE CASCADE
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `recovery_codes` (
  `user_id` varchar(32) NOT NULL,
  `hash` char(64) NOT NULL,
  `used_at` datetime(3) DEFAULT NULL,
  PRIMARY KEY (`user_id`,`hash`),
  CONSTRAINT `recovery_codes_user` FOREIGN KEY (`user_id`) REFERENCES `users` (`id`) ON DELETE CASCADE
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `reference_rows` (
  `row_key` varchar(80) NOT NULL,
  `version` int(10) unsigned NOT NULL,
  `maker` varchar(16) NOT NULL,
  `table_name` varchar(32) NOT NULL,
  `division` varchar(400) NOT NULL,
  `line` varchar(400) NOT NULL,
  `body` varchar(400) NOT NULL,
  `engine` varchar(400) NOT NULL,
  `plant` varchar(400) NOT NULL,
  `market` varchar(400) NOT NULL,
  `years_from` smallint(5) unsigned DEFAULT NULL,
  `years_to` smallint(5) unsigned DEFAULT NULL,
  `code` varchar(64) NOT NULL,
  `meaning` varchar(600) CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci NOT NULL,
  `values` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL CHECK (json_valid(`values`)),
  `note` varchar(1200) NOT NULL,
  `edition_from` int(10) unsigned NOT NULL,
  `edition_to` int(10) unsigned DEFAULT NULL,
  `live_key` varchar(80) GENERATED ALWAYS AS (case when `edition_to` is null then `row_key` end) VIRTUAL,
  PRIMARY KEY (`row_key`,`version`),
  UNIQUE KEY `one_live` (`live_key`),
  KEY `table_code` (`maker`,`table_name`,`code`),
  KEY `rows_from` (`edition_from`),
  KEY `rows_to` (`edition_to`),
  CONSTRAINT `rows_from` FOREIGN KEY (`edition_from`) REFERENCES `editions` (`number`),
  CONSTRAINT `rows_to` FOREIGN KEY (`edition_to`) REFERENCES `editions` (`number`),
  CONSTRAINT `rows_span` CHECK (`edition_to` > `edition_from`),
  CONSTRAINT `rows_years` CHECK (`years_from` is null = (`years_to` is null) and (`years_from` is null or `years_from` <= `years_to`))
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `release_conflicts` (
  `load_number` int(10) unsigned NOT NULL,
  `kind` enum('row','source','claim') NOT NULL,
  `entry_key` varchar(80) NOT NULL,
  `reason` enum('added_in_both','changed_in_both','retired_here','retired_in_release','still_cited') NOT NULL,
  `base` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin DEFAULT NULL CHECK (json_valid(`base`)),
  `theirs` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin DEFAULT NULL CHECK (json_valid(`theirs`)),
  `ours` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin DEFAULT NULL CHECK (json_valid(`ours`)),
  `resolved_at` datetime(3) DEFAULT NULL,
  `resolved_by` varchar(32) DEFAULT NULL,
  PRIMARY KEY (`load_number`,`kind`,`entry_key`),
  KEY `open_ones` (`resolved_at`),
  KEY `release_conflicts_user` (`resolved_by`),
  CONSTRAINT `release_conflicts_load` FOREIGN KEY (`load_number`) REFERENCES `release_loads` (`number`),
  CONSTRAINT `release_conflicts_user` FOREIGN KEY (`resolved_by`) REFERENCES `users` (`id`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `release_loads` (
  `number` int(10) unsigned NOT NULL,
  `edition` int(10) unsigned NOT NULL,
  `digest` char(64) NOT NULL,
  `content` longblob NOT NULL,
  `loaded_at` datetime(3) NOT NULL,
  PRIMARY KEY (`number`),
  KEY `release_loads_edition` (`edition`),
  CONSTRAINT `release_loads_edition` FOREIGN KEY (`edition`) REFERENCES `editions` (`number`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `saved_readings` (
  `id` varchar(32) NOT NULL,
  `owner` varchar(32) DEFAULT NULL,
  `kind` varchar(16) NOT NULL,
  `text` varchar(600) NOT NULL,
  `context` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL CHECK (json_valid(`context`)),
  `edition` int(10) unsigned NOT NULL,
  `reader` varchar(64) NOT NULL,
  `result` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL CHECK (json_valid(`result`)),
  `version` int(10) unsigned NOT NULL DEFAULT 1,
  `saved_at` datetime(3) NOT NULL,
  PRIMARY KEY (`id`),
  KEY `of_owner` (`owner`,`saved_at`),
  KEY `saved_readings_edition` (`edition`),
  CONSTRAINT `saved_readings_edition` FOREIGN KEY (`edition`) REFERENCES `editions` (`number`),
  CONSTRAINT `saved_readings_owner` FOREIGN KEY (`owner`) REFERENCES `users` (`id`) ON DELETE SET NULL
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `saved_reading_uses` (
  `reading_id` varchar(32) NOT NULL,
  `position` smallint(5) unsigned NOT NULL,
  `table_name` varchar(32) NOT NULL,
  `code` varchar(64) NOT NULL,
  `row_key` varchar(80) DEFAULT NULL,
  PRIMARY KEY (`reading_id`,`position`),
  KEY `looked_up` (`table_name`,`code`),
  KEY `rested_on` (`row_key`),
  CONSTRAINT `saved_reading_uses_reading` FOREIGN KEY (`reading_id`) REFERENCES `saved_readings` (`id`) ON DELETE CASCADE
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `second_factors` (
  `user_id` varchar(32) NOT NULL,
  `sealed_secret` varchar(255) NOT NULL,
  `created_at` datetime(3) NOT NULL,
  `confirmed_at` datetime(3) DEFAULT NULL,
  `last_step` int(10) unsigned NOT NULL DEFAULT 0,
  PRIMARY KEY (`user_id`),
  CONSTRAINT `second_factors_user` FOREIGN KEY (`user_id`) REFERENCES `users` (`id`) ON DELETE CASCADE
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `sessions` (
  `id` varchar(64) NOT NULL,
  `user_id` varchar(32) NOT NULL,
  `device` varchar(120) NOT NULL,
  `way` varchar(16) NOT NULL,
  `code_given_at` datetime(3) DEFAULT NULL,
  `created_at` datetime(3) NOT NULL,
  `seen_at` datetime(3) NOT NULL,
  `expires_at` datetime(3) NOT NULL,
  `revoked_at` datetime(3) DEFAULT NULL,
  PRIMARY KEY (`id`),
  KEY `of_user` (`user_id`),
  KEY `expiry` (`expires_at`),
  CONSTRAINT `sessions_user` FOREIGN KEY (`user_id`) REFERENCES `users` (`id`) ON DELETE CASCADE
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `shared_counters` (
  `counter_key` varchar(160) NOT NULL,
  `window_from` datetime(3) NOT NULL,
  `used` int(10) unsigned NOT NULL,
  `expires_at` datetime(3) NOT NULL,
  PRIMARY KEY (`counter_key`,`window_from`),
  KEY `expiry` (`expires_at`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `sources` (
  `source_key` varchar(80) NOT NULL,
  `version` int(10) unsigned NOT NULL,
  `title` varchar(300) CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci NOT NULL,
  `publisher` varchar(200) CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci NOT NULL,
  `year` smallint(5) unsigned DEFAULT NULL,
  `kind` varchar(32) NOT NULL,
  `seen_at` varchar(500) NOT NULL,
  `licence` varchar(200) NOT NULL,
  `repeats` varchar(80) DEFAULT NULL,
  `edition_from` int(10) unsigned NOT NULL,
  `edition_to` int(10) unsigned DEFAULT NULL,
  `live_key` varchar(80) GENERATED ALWAYS AS (case when `edition_to` is null then `source_key` end) VIRTUAL,
  PRIMARY KEY (`source_key`,`version`),
  UNIQUE KEY `one_live` (`live_key`),
  KEY `repeats` (`repeats`),
  KEY `sources_from` (`edition_from`),
  KEY `sources_to` (`edition_to`),
  CONSTRAINT `sources_from` FOREIGN KEY (`edition_from`) REFERENCES `editions` (`number`),
  CONSTRAINT `sources_to` FOREIGN KEY (`edition_to`) REFERENCES `editions` (`number`),
  CONSTRAINT `sources_span` CHECK (`edition_to` > `edition_from`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

CREATE TABLE `users` (
  `id` varchar(32) NOT NULL,
  `name` varchar(120) CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_520_ci DEFAULT NULL,
  `email` varchar(254) DEFAULT NULL,
  `email_verified_at` datetime(3) DEFAULT NULL,
  `password_hash` varchar(255) DEFAULT NULL,
  `role` enum('member','moderator','administrator') NOT NULL DEFAULT 'member',
  `areas` longtext CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL DEFAULT '[]' CHECK (json_valid(`areas`)),
  `paused_until` datetime(3) DEFAULT NULL,
  `pause_reason` varchar(300) DEFAULT NULL,
  `consented_to` varchar(32) DEFAULT NULL,
  `consented_at` datetime(3) DEFAULT NULL,
  `demo` tinyint(1) NOT NULL DEFAULT 0,
  `version` int(10) unsigned NOT NULL DEFAULT 1,
  `created_at` datetime(3) NOT NULL,
  `deleted_at` datetime(3) DEFAULT NULL,
  PRIMARY KEY (`id`),
  UNIQUE KEY `email` (`email`)
) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_nopad_bin;

SET FOREIGN_KEY_CHECKS = 1;
