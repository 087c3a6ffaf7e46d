import type { Sequelize } from 'sequelize';
import { BuildTerms, initBuildTerms } from './build-terms.ts';
import { initFirstFlight } from './first-flight.ts';
import { GliderAssignment, initGliderAssignment } from './glider-assignment.ts';
import { GliderMaterial, initGliderMaterial } from './glider-material.ts';
import { GliderMember, initGliderMember } from './glider-member.ts';
import { GliderPhoto, initGliderPhoto } from './glider-photo.ts';
import { initGliderSaveName } from './glider-save-name.ts';
import { GliderSave, initGliderSave } from './glider-save.ts';
import { GliderTrials, initGliderTrials } from './glider-trials.ts';
import { Glider, initGlider } from './glider.ts';
import { initIdempotencyKey } from './idempotency-key.ts';
import { initMaterial } from './material.ts';
import { Session, initSession } from './session.ts';
import { initSheet } from './sheet.ts';
import { StockPiece, initStockPiece } from './stock-piece.ts';
import { User, initUser } from './user.ts';
import { initWeighing } from './weighing.ts';

/** Binds every model to a database; all associations between them are here and nowhere else. */
export function initModels(sequelize: Sequelize): void {
  initUser(sequelize);
  initSession(sequelize);
  initIdempotencyKey(sequelize);
  initMaterial(sequelize);
  initGlider(sequelize);
  initGliderMember(sequelize);
  initGliderMaterial(sequelize);
  initGliderSave(sequelize);
  initGliderSaveName(sequelize);
  initGliderPhoto(sequelize);
  initSheet(sequelize);
  initGliderTrials(sequelize);
  initStockPiece(sequelize);
  initWeighing(sequelize);
  initBuildTerms(sequelize);
  initFirstFlight(sequelize);
  initGliderAssignment(sequelize);

  Session.belongsTo(User, { as: 'user', foreignKey: 'userId' });
  Glider.belongsTo(User, { as: 'owner', foreignKey: 'ownerId' });
  Glider.belongsTo(User, { as: 'editor', foreignKey: 'updatedBy' });
  Glider.hasMany(GliderMember, { as: 'members', foreignKey: 'gliderId' });
  GliderMember.belongsTo(Glider, { as: 'glider', foreignKey: 'gliderId' });
  GliderMember.belongsTo(User, { as: 'user', foreignKey: 'userId' });
  GliderMaterial.belongsTo(Glider, { as: 'glider', foreignKey: 'gliderId' });
  GliderSave.belongsTo(User, { as: 'author', foreignKey: 'savedBy' });
  GliderPhoto.belongsTo(User, { as: 'adder', foreignKey: 'addedBy' });
  StockPiece.belongsTo(User, { as: 'user', foreignKey: 'userId' });
  GliderAssignment.belongsTo(User, { as: 'editor', foreignKey: 'updatedBy' });
  GliderTrials.belongsTo(User, { as: 'editor', foreignKey: 'updatedBy' });
  BuildTerms.belongsTo(User, { as: 'editor', foreignKey: 'updatedBy' });
}
