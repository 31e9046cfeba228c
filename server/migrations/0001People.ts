import type { MigrationInterface, QueryRunner } from 'typeorm';

/** People, their sessions and the event log. One statement a step; each can run again. */
export class People1764500000001 implements MigrationInterface {
  name = 'People1764500000001';
  transaction = false as const;

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS user (
        id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
        email VARCHAR(254) NOT NULL,
        name VARCHAR(120) NOT NULL,
        roles VARCHAR(100) NOT NULL,
        status ENUM('active', 'disabled') NOT NULL DEFAULT 'active',
        password_hash VARCHAR(100) NOT NULL,
        version INT UNSIGNED NOT NULL DEFAULT 1,
        created_at DATETIME(6) NOT NULL DEFAULT CURRENT_TIMESTAMP(6),
        UNIQUE KEY user_email (email)
      ) ENGINE=InnoDB`);
    await runner.query(`
      CREATE TABLE IF NOT EXISTS user_session (
        id_hash CHAR(64) CHARACTER SET ascii NOT NULL PRIMARY KEY,
        user_id INT UNSIGNED NOT NULL,
        data TEXT NOT NULL,
        opened_at DATETIME(3) NOT NULL,
        seen_at DATETIME(3) NOT NULL,
        KEY user_session_user (user_id),
        KEY user_session_seen (seen_at),
        CONSTRAINT user_session_user FOREIGN KEY (user_id) REFERENCES user (id) ON DELETE RESTRICT
      ) ENGINE=InnoDB`);
    await runner.query(`
      CREATE TABLE IF NOT EXISTS event (
        id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
        at VARCHAR(27) CHARACTER SET ascii NOT NULL,
        actor_id INT UNSIGNED NULL,
        actor VARCHAR(120) NULL,
        action VARCHAR(60) NOT NULL,
        object_type VARCHAR(40) NOT NULL,
        object_id INT UNSIGNED NULL,
        fixture_id INT UNSIGNED NULL,
        outcome ENUM('done', 'refused') NOT NULL,
        summary VARCHAR(500) NOT NULL,
        before_json LONGTEXT NULL,
        after_json LONGTEXT NULL,
        request_id VARCHAR(60) NULL,
        KEY event_fixture (fixture_id, id),
        KEY event_action (action, id)
      ) ENGINE=InnoDB`);
    // Second line behind the grants: even an account that may change rows cannot change these.
    await runner.query(`
      CREATE OR REPLACE TRIGGER event_no_update BEFORE UPDATE ON event FOR EACH ROW
        SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'the event log is append-only'`);
    await runner.query(`
      CREATE OR REPLACE TRIGGER event_no_delete BEFORE DELETE ON event FOR EACH ROW
        SIGNAL SQLSTATE '45000' SET MESSAGE_TEXT = 'the event log is append-only'`);
  }

  down(): Promise<void> {
    return Promise.reject(new Error('Migrations go forward only: restore a backup instead.'));
  }
}
