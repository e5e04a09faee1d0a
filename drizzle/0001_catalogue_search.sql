-- Two full-text tables over the words of the entries shown: trigrams find any part of a word of three letters or more,
-- whole words with a prefix index answer one or two letters and give the list of words to compare a misspelling with.
CREATE VIRTUAL TABLE `entry_grams` USING fts5(entry_id UNINDEXED, words, tokenize = 'trigram');
--> statement-breakpoint
CREATE VIRTUAL TABLE `entry_words` USING fts5(entry_id UNINDEXED, words, tokenize = 'unicode61', prefix = '1 2');
--> statement-breakpoint
CREATE VIRTUAL TABLE `entry_terms` USING fts5vocab('entry_words', 'row');
--> statement-breakpoint
CREATE TRIGGER `entries_shown_insert` AFTER INSERT ON `entries` WHEN NEW.current_version_id IS NOT NULL AND NEW.retired_at IS NULL BEGIN
  INSERT INTO entry_grams (entry_id, words) SELECT entry_id, search_text FROM entry_versions WHERE id = NEW.current_version_id;
  INSERT INTO entry_words (entry_id, words) SELECT entry_id, search_text FROM entry_versions WHERE id = NEW.current_version_id;
END;
--> statement-breakpoint
CREATE TRIGGER `entries_shown_update` AFTER UPDATE OF current_version_id, retired_at ON `entries` WHEN NEW.current_version_id IS NOT OLD.current_version_id OR NEW.retired_at IS NOT OLD.retired_at BEGIN
  DELETE FROM entry_grams WHERE OLD.current_version_id IS NOT NULL AND entry_id = OLD.id;
  DELETE FROM entry_words WHERE OLD.current_version_id IS NOT NULL AND entry_id = OLD.id;
  INSERT INTO entry_grams (entry_id, words) SELECT entry_id, search_text FROM entry_versions WHERE id = NEW.current_version_id AND NEW.retired_at IS NULL;
  INSERT INTO entry_words (entry_id, words) SELECT entry_id, search_text FROM entry_versions WHERE id = NEW.current_version_id AND NEW.retired_at IS NULL;
END;
--> statement-breakpoint
CREATE TRIGGER `entry_versions_shown_insert` AFTER INSERT ON `entry_versions` WHEN EXISTS (SELECT 1 FROM entries WHERE id = NEW.entry_id AND current_version_id = NEW.id AND retired_at IS NULL) BEGIN
  INSERT INTO entry_grams (entry_id, words) VALUES (NEW.entry_id, NEW.search_text);
  INSERT INTO entry_words (entry_id, words) VALUES (NEW.entry_id, NEW.search_text);
END;
