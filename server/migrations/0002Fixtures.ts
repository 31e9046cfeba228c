import type { MigrationInterface, QueryRunner } from 'typeorm';

const byFixture = 'FOREIGN KEY (fixture_id) REFERENCES fixture (id) ON DELETE RESTRICT';
const created = `created_at DATETIME(6) NOT NULL DEFAULT CURRENT_TIMESTAMP(6),
        created_by VARCHAR(120) NOT NULL`;

/** Fixtures and all that hangs on them. One statement a step; each can run again. */
export class Fixtures1764500000002 implements MigrationInterface {
  name = 'Fixtures1764500000002';
  transaction = false as const;

  async up(runner: QueryRunner): Promise<void> {
    await runner.query(`
      CREATE TABLE IF NOT EXISTS fixture (
        id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
        code VARCHAR(24) NOT NULL,
        name VARCHAR(120) NOT NULL,
        line VARCHAR(60) NOT NULL,
        status VARCHAR(20) NOT NULL,
        remark TEXT NULL,
        spec LONGTEXT NOT NULL,
        version INT UNSIGNED NOT NULL DEFAULT 1,
        data_version INT UNSIGNED NOT NULL DEFAULT 1,
        created_at DATETIME(6) NOT NULL DEFAULT CURRENT_TIMESTAMP(6),
        updated_at DATETIME(6) NOT NULL DEFAULT CURRENT_TIMESTAMP(6),
        UNIQUE KEY fixture_code (code),
        KEY fixture_line (line)
      ) ENGINE=InnoDB`);
    await runner.query(`
      CREATE TABLE IF NOT EXISTS build_up (
        id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
        fixture_id INT UNSIGNED NOT NULL,
        revision INT UNSIGNED NOT NULL,
        content LONGTEXT NOT NULL,
        ${created},
        UNIQUE KEY build_up_revision (fixture_id, revision),
        CONSTRAINT build_up_fixture ${byFixture}
      ) ENGINE=InnoDB`);
    await runner.query(`
      CREATE TABLE IF NOT EXISTS configuration (
        id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
        fixture_id INT UNSIGNED NOT NULL,
        label VARCHAR(40) NOT NULL,
        position_mm DOUBLE NOT NULL,
        measured_inertia TEXT NULL,
        version INT UNSIGNED NOT NULL DEFAULT 1,
        UNIQUE KEY configuration_label (fixture_id, label),
        CONSTRAINT configuration_fixture ${byFixture}
      ) ENGINE=InnoDB`);
    await runner.query(`
      CREATE TABLE IF NOT EXISTS friction_test (
        id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
        fixture_id INT UNSIGNED NOT NULL,
        kind VARCHAR(20) NOT NULL,
        face VARCHAR(60) NULL,
        surfaces VARCHAR(120) NOT NULL,
        batch VARCHAR(60) NULL,
        tested_on CHAR(10) NOT NULL,
        readings TEXT NOT NULL,
        reading_uncertainty DOUBLE NOT NULL,
        remark TEXT NULL,
        excluded BOOLEAN NOT NULL DEFAULT FALSE,
        excluded_reason TEXT NULL,
        version INT UNSIGNED NOT NULL DEFAULT 1,
        ${created},
        CONSTRAINT friction_test_fixture ${byFixture}
      ) ENGINE=InnoDB`);
    await runner.query(`
      CREATE TABLE IF NOT EXISTS trial_log (
        id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
        fixture_id INT UNSIGNED NOT NULL,
        file_name VARCHAR(200) NOT NULL,
        size INT UNSIGNED NOT NULL,
        sha256 CHAR(64) CHARACTER SET ascii NOT NULL,
        raw LONGBLOB NOT NULL,
        accepted INT UNSIGNED NOT NULL,
        refused INT UNSIGNED NOT NULL,
        problems LONGTEXT NOT NULL,
        mapping LONGTEXT NOT NULL,
        ${created},
        UNIQUE KEY trial_log_bytes (fixture_id, sha256),
        CONSTRAINT trial_log_fixture ${byFixture}
      ) ENGINE=InnoDB`);
    await runner.query(`
      CREATE TABLE IF NOT EXISTS trial (
        id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
        fixture_id INT UNSIGNED NOT NULL,
        log_id INT UNSIGNED NOT NULL,
        configuration_id INT UNSIGNED NOT NULL,
        log_row INT UNSIGNED NOT NULL,
        acceleration DOUBLE NOT NULL,
        outcome VARCHAR(10) NOT NULL,
        judged_by VARCHAR(20) NULL,
        slip_angle DOUBLE NULL,
        run_order DOUBLE NULL,
        at DATETIME(6) NULL,
        direction VARCHAR(60) NULL,
        part VARCHAR(60) NULL,
        seating VARCHAR(60) NULL,
        series VARCHAR(60) NULL,
        batch VARCHAR(60) NULL,
        temperature DOUBLE NULL,
        remark TEXT NULL,
        excluded BOOLEAN NOT NULL DEFAULT FALSE,
        excluded_reason TEXT NULL,
        excluded_by VARCHAR(120) NULL,
        excluded_at DATETIME(6) NULL,
        version INT UNSIGNED NOT NULL DEFAULT 1,
        KEY trial_fixture (fixture_id, id),
        KEY trial_level (fixture_id, configuration_id, acceleration),
        CONSTRAINT trial_fixture ${byFixture},
        CONSTRAINT trial_log FOREIGN KEY (log_id) REFERENCES trial_log (id) ON DELETE RESTRICT,
        CONSTRAINT trial_configuration FOREIGN KEY (configuration_id)
          REFERENCES configuration (id) ON DELETE RESTRICT
      ) ENGINE=InnoDB`);
    await runner.query(`
      CREATE TABLE IF NOT EXISTS analysis (
        id INT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
        fixture_id INT UNSIGNED NOT NULL,
        digest CHAR(64) CHARACTER SET ascii NOT NULL,
        build_up_revision INT UNSIGNED NULL,
        data_version INT UNSIGNED NOT NULL,
        options LONGTEXT NOT NULL,
        request LONGTEXT NOT NULL,
        result LONGTEXT NOT NULL,
        note TEXT NULL,
        ${created},
        KEY analysis_fixture (fixture_id, id),
        CONSTRAINT analysis_fixture ${byFixture}
      ) ENGINE=InnoDB`);
    await runner.query(`
      CREATE TABLE IF NOT EXISTS boundary_cache (
        fixture_id INT UNSIGNED NOT NULL PRIMARY KEY,
        data_version INT UNSIGNED NOT NULL,
        engine VARCHAR(40) NOT NULL,
        digest CHAR(64) CHARACTER SET ascii NOT NULL,
        verdict VARCHAR(20) NOT NULL,
        verdict_rank INT UNSIGNED NOT NULL,
        sentence TEXT NOT NULL,
        bench_mu DOUBLE NULL,
        result LONGTEXT NULL,
        CONSTRAINT boundary_cache_fixture ${byFixture}
      ) ENGINE=InnoDB`);
  }

  down(): Promise<void> {
    return Promise.reject(new Error('Migrations go forward only: restore a backup instead.'));
  }
}
