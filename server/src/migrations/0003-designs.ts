import type { QueryInterface } from 'sequelize';

// Drafts and predictions name their workshop as well as their design, and the database holds them to it: a row
// cannot come to lie in another workshop than its design.
const TABLES = [
  `CREATE TABLE designs (
    id INT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    workshop_id INT NOT NULL,
    name VARCHAR(120) NOT NULL,
    kind VARCHAR(20) NOT NULL,
    lowest_note VARCHAR(8) NULL,
    lowest_midi INT NULL,
    temperament VARCHAR(40) NOT NULL,
    a4_hz DOUBLE NOT NULL,
    draft_version INT NOT NULL,
    revision_number INT NOT NULL,
    state ENUM('draft', 'in-review', 'approved', 'superseded', 'withdrawn') NOT NULL,
    rack_view JSON NOT NULL,
    created_by_id INT NOT NULL,
    changed_by_id INT NOT NULL,
    created_at DATETIME(3) NOT NULL,
    changed_at DATETIME(3) NOT NULL,
    archived_at DATETIME(3) NULL,
    UNIQUE KEY designs_in_workshop (id, workshop_id),
    KEY designs_changed (workshop_id, changed_at),
    KEY designs_name (workshop_id, name),
    CONSTRAINT designs_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id),
    CONSTRAINT designs_created_by FOREIGN KEY (created_by_id) REFERENCES people (id),
    CONSTRAINT designs_changed_by FOREIGN KEY (changed_by_id) REFERENCES people (id)
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci`,
  `CREATE TABLE drafts (
    design_id INT NOT NULL PRIMARY KEY,
    workshop_id INT NOT NULL,
    version INT NOT NULL,
    document JSON NOT NULL,
    saved_by_id INT NOT NULL,
    saved_at DATETIME(3) NOT NULL,
    CONSTRAINT drafts_design FOREIGN KEY (design_id, workshop_id) REFERENCES designs (id, workshop_id),
    CONSTRAINT drafts_saved_by FOREIGN KEY (saved_by_id) REFERENCES people (id)
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci`,
  `CREATE TABLE predictions (
    design_id INT NOT NULL PRIMARY KEY,
    workshop_id INT NOT NULL,
    draft_version INT NOT NULL,
    engine VARCHAR(60) NOT NULL,
    document_hash CHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
    prediction JSON NOT NULL,
    sensitivities JSON NULL,
    computed_at DATETIME(3) NOT NULL,
    CONSTRAINT predictions_design FOREIGN KEY (design_id, workshop_id) REFERENCES designs (id, workshop_id)
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci`,
];

export async function up({ context }: { context: QueryInterface }): Promise<void> {
  for (const table of TABLES) await context.sequelize.query(table);
}
