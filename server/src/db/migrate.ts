import { QueryTypes, type Sequelize, type Transaction } from 'sequelize';
import { SequelizeStorage, Umzug } from 'umzug';
import { StartRefusal } from '../config.ts';
import { ALL_MIGRATIONS } from '../migrations/all-migrations.ts';

/** SQL: names of locks are shared by all databases of a server. */
const LOCK = 'CONCAT("borewright ", DATABASE())';
const LOCK_WAIT_S = 60;

/**
 * Brings the tables up to this program's version; does nothing when they are.
 *
 * @throws StartRefusal if a newer version of the program has been at this database
 */
export async function migrateDatabase(sequelize: Sequelize): Promise<void> {
  const storage = new SequelizeStorage({ sequelize, tableName: 'migrations' });
  const context = sequelize.getQueryInterface();
  const umzug = new Umzug({ migrations: [...ALL_MIGRATIONS], context, storage, logger: undefined });
  await withLock(sequelize, async () => {
    const known = new Set(ALL_MIGRATIONS.map((migration) => migration.name));
    // Umzug itself leaves out of its list what it does not know.
    const newer = (await storage.executed()).filter((name) => !known.has(name));
    if (newer.length > 0) {
      throw new StartRefusal(
        `This database was last used by a newer version of Borewright (it has ${newer.join(', ')}): start that version, or restore a backup from before.`,
      );
    }
    await umzug.up();
  });
}

/** Several processes may start at once on one database: one migrates, the others wait for it. */
async function withLock(sequelize: Sequelize, work: () => Promise<void>): Promise<void> {
  // The lock belongs to a connection, and a transaction is how one connection is held.
  await sequelize.transaction(async (transaction) => {
    await takeLock(sequelize, transaction);
    try {
      await work();
    } finally {
      await sequelize.query(`DO RELEASE_LOCK(${LOCK})`, { transaction });
    }
  });
}

async function takeLock(sequelize: Sequelize, transaction: Transaction): Promise<void> {
  const [row] = await sequelize.query<{ taken: number | null }>(`SELECT GET_LOCK(${LOCK}, ?) AS taken`, {
    replacements: [LOCK_WAIT_S],
    type: QueryTypes.SELECT,
    transaction,
  });
  if (Number(row?.taken) !== 1) {
    throw new StartRefusal(
      'Another process has been changing this database for a minute: wait until it is done, then start again.',
    );
  }
}
