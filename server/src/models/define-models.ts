import type { Sequelize } from 'sequelize';
import { defineDesign } from './design.ts';
import { defineDraft } from './draft.ts';
import { defineMembership } from './membership.ts';
import { definePerson } from './person.ts';
import { definePrediction } from './prediction.ts';
import { defineRefreshToken } from './refresh-token.ts';
import { defineSession } from './session.ts';
import { defineTry } from './try.ts';
import { defineWorkshop } from './workshop.ts';

export type Models = ReturnType<typeof defineModels>;

/**
 * All tables of one connection, and how they hang together.
 *
 * `owned` are the tables that belong to a workshop; only `WorkshopScope` reaches into them.
 */
export function defineModels(sequelize: Sequelize) {
  const people = {
    Workshop: defineWorkshop(sequelize),
    Person: definePerson(sequelize),
    Membership: defineMembership(sequelize),
    Session: defineSession(sequelize),
    RefreshToken: defineRefreshToken(sequelize),
    Try: defineTry(sequelize),
  };
  const owned = {
    Membership: people.Membership,
    Design: defineDesign(sequelize),
    Draft: defineDraft(sequelize),
    Prediction: definePrediction(sequelize),
  };
  people.Membership.belongsTo(people.Person, { as: 'person', foreignKey: 'personId' });
  people.Membership.belongsTo(people.Workshop, { as: 'workshop', foreignKey: 'workshopId' });
  owned.Design.belongsTo(people.Person, { as: 'createdBy', foreignKey: 'createdById' });
  owned.Design.belongsTo(people.Person, { as: 'changedBy', foreignKey: 'changedById' });
  owned.Draft.belongsTo(people.Person, { as: 'savedBy', foreignKey: 'savedById' });
  owned.Draft.belongsTo(owned.Design, { as: 'design', foreignKey: 'designId' });
  owned.Prediction.belongsTo(owned.Design, { as: 'design', foreignKey: 'designId' });
  return { people, owned };
}
