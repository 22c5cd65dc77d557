import type { QueryInterface } from 'sequelize';

const TABLES = [
  `CREATE TABLE workshops (
    id INT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    name VARCHAR(100) NOT NULL,
    unit ENUM('mm', 'inch') NOT NULL,
    a4_hz DOUBLE NOT NULL,
    temperature_c DOUBLE NOT NULL,
    band1_cents DOUBLE NOT NULL,
    band2_cents DOUBLE NOT NULL,
    band3_cents DOUBLE NOT NULL,
    reference_end ENUM('foot', 'mouth') NOT NULL,
    created_at DATETIME(3) NOT NULL
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci`,
  `CREATE TABLE people (
    id INT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    name VARCHAR(100) NOT NULL,
    email VARCHAR(200) NOT NULL COLLATE utf8mb4_bin,
    password_hash VARCHAR(100) NOT NULL COLLATE utf8mb4_bin,
    created_at DATETIME(3) NOT NULL,
    UNIQUE KEY people_email (email)
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci`,
  `CREATE TABLE memberships (
    id INT NOT NULL AUTO_INCREMENT PRIMARY KEY,
    workshop_id INT NOT NULL,
    person_id INT NOT NULL,
    role ENUM('owner', 'mentor', 'maker', 'apprentice', 'visitor') NOT NULL,
    last_here_at DATETIME(3) NULL,
    UNIQUE KEY memberships_one_role (workshop_id, person_id),
    KEY memberships_person (person_id),
    CONSTRAINT memberships_workshop FOREIGN KEY (workshop_id) REFERENCES workshops (id),
    CONSTRAINT memberships_person FOREIGN KEY (person_id) REFERENCES people (id)
  ) ENGINE=InnoDB DEFAULT CHARSET=utf8mb4 COLLATE=utf8mb4_unicode_520_ci`,
];

export async function up({ context }: { context: QueryInterface }): Promise<void> {
  for (const table of TABLES) await context.sequelize.query(table);
}
