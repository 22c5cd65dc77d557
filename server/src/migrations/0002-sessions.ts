import type { QueryInterface } from 'sequelize';

const TABLES = [
  `CREATE TABLE sessions (
    id INT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    person_id INT NOT NULL,
    workshop_id INT NOT NULL,
    created_at DATETIME(3) NOT NULL,
    expires_at DATETIME(3) NOT NULL,
    ended_at DATETIME(3) NULL,
    ended_because VARCHAR(20) NULL,
    KEY sessions_expiry (expires_at),
    CONSTRAINT sessions_person FOREIGN KEY (person_id) REFERENCES people (id),
    CONSTRAINT sessions_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id)
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci`,
  `CREATE TABLE refresh_tokens (
    token_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
    session_id INT NOT NULL,
    used_at DATETIME(3) NULL,
    CONSTRAINT refresh_tokens_session FOREIGN KEY (session_id) REFERENCES sessions (id) ON DELETE CASCADE
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci`,
  `CREATE TABLE tries (
    key_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
    count INT NOT NULL,
    resets_at DATETIME(3) NOT NULL,
    KEY tries_reset (resets_at)
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci`,
];

export async function up({ context }: { context: QueryInterface }): Promise<void> {
  for (const table of TABLES) await context.sequelize.query(table);
}
