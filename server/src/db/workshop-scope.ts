import {
  Op,
  type Attributes,
  type CountOptions,
  type CreationAttributes,
  type FindOptions,
  type Model,
  type ModelStatic,
  type Transaction,
  type UpdateOptions,
  type WhereOptions,
} from 'sequelize';
import { designReach } from '#shared/rules/permissions.ts';
import { notFound } from '../http/http-error.ts';
import type { Caller } from '../identity/caller.ts';
import type { DesignRow } from '../models/design.ts';
import type { Database } from './connect.ts';

/** A row that belongs to one workshop. */
type Owned = Model & { workshopId: number };

/**
 * A table as one workshop sees it: whatever is asked, read or written, the workshop is part of it.
 *
 * Features reach workshop-owned tables in no other way.
 */
class WorkshopTable<M extends Owned> {
  readonly #model: ModelStatic<M>;
  readonly #scope: WorkshopScope;

  constructor(model: ModelStatic<M>, scope: WorkshopScope) {
    this.#model = model;
    this.#scope = scope;
  }

  findOne(options: FindOptions<Attributes<M>>): Promise<M | null> {
    return this.#model.findOne(this.#within(options));
  }

  findAll(options: FindOptions<Attributes<M>>): Promise<M[]> {
    return this.#model.findAll(this.#within(options));
  }

  count(options: Omit<CountOptions<Attributes<M>>, 'group'>): Promise<number> {
    return this.#model.count(this.#within(options));
  }

  create(values: Omit<CreationAttributes<M>, 'workshopId'>): Promise<M> {
    return this.#model.create(this.#owned(values), { transaction: this.#scope.transaction });
  }

  /** Writes a row whose primary key may be there already. */
  async put(values: Omit<CreationAttributes<M>, 'workshopId'>): Promise<void> {
    await this.#model.upsert(this.#owned(values), { transaction: this.#scope.transaction });
  }

  /** Returns how many rows it changed. */
  async update(
    values: Partial<Attributes<M>>,
    options: Pick<UpdateOptions<Attributes<M>>, 'where'>,
  ): Promise<number> {
    const [changed] = await this.#model.update(values, this.#within(options));
    return changed;
  }

  #owned(values: Omit<CreationAttributes<M>, 'workshopId'>): CreationAttributes<M> {
    // What was left out of the attributes is put back; the compiler cannot add that up for a type it does not know.
    return { ...values, workshopId: this.#scope.caller.workshopId } as unknown as CreationAttributes<M>;
  }

  #within<T extends { where?: WhereOptions<Attributes<M>> }>(options: T) {
    const { workshopId } = this.#scope.caller;
    const where = { [Op.and]: [options.where ?? {}, { workshopId }] } as WhereOptions<Attributes<M>>;
    return { ...options, where, transaction: this.#scope.transaction };
  }
}

/** Everything that a caller's requests may reach in the database, and the transaction they run in. */
export class WorkshopScope {
  readonly designs: WorkshopTable<DesignRow>;
  readonly drafts;
  readonly predictions;
  readonly memberships;
  readonly caller: Caller;
  readonly transaction: Transaction | null;
  readonly #database: Database;

  constructor(database: Database, caller: Caller, transaction: Transaction | null = null) {
    this.#database = database;
    this.caller = caller;
    this.transaction = transaction;
    const { owned } = database;
    this.designs = new WorkshopTable(owned.Design, this);
    this.drafts = new WorkshopTable(owned.Draft, this);
    this.predictions = new WorkshopTable(owned.Prediction, this);
    this.memberships = new WorkshopTable(owned.Membership, this);
  }

  /** Runs work that is kept whole or not at all. */
  inTransaction<T>(work: (scope: WorkshopScope) => Promise<T>): Promise<T> {
    return this.#database.sequelize.transaction((transaction) =>
      work(new WorkshopScope(this.#database, this.caller, transaction)),
    );
  }

  /** The designs that the caller's role lets them see, as a condition on the designs table. */
  visibleDesigns(): WhereOptions<DesignRow> {
    const reach = designReach(this.caller.role);
    if (reach === 'all') return {};
    return reach === 'own' ? { createdById: this.caller.personId } : { id: { [Op.in]: [] } };
  }

  /** @throws HttpError 404 when there is none, or none for this caller's eyes */
  async visibleDesign(id: number, options: Omit<FindOptions<DesignRow>, 'where'> = {}): Promise<DesignRow> {
    const where = { [Op.and]: [{ id }, this.visibleDesigns()] };
    const design = await this.designs.findOne({ ...options, where });
    if (design === null) throw notFound();
    return design;
  }
}
