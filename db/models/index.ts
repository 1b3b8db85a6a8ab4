import { sequelize } from '../connection';
import { AuditEntry, init as initAuditEntry } from './AuditEntry';
import { Blanket, init as initBlanket } from './Blanket';
import { BlanketColourLink, init as initBlanketColourLink } from './BlanketColourLink';
import { BlanketRevision, init as initBlanketRevision } from './BlanketRevision';
import { Colourway, init as initColourway } from './Colourway';
import { DyeLot, init as initDyeLot } from './DyeLot';
import { EmailToken, init as initEmailToken } from './EmailToken';
import { MadeMotifRow, init as initMadeMotifRow } from './MadeMotifRow';
import { MakingTick, init as initMakingTick } from './MakingTick';
import { MakingWeighing, init as initMakingWeighing } from './MakingWeighing';
import { MotifRow, init as initMotifRow } from './MotifRow';
import { MotifVersion, init as initMotifVersion } from './MotifVersion';
import { OwnStitchRow, init as initOwnStitchRow } from './OwnStitchRow';
import { PartSkein, init as initPartSkein } from './PartSkein';
import { ShoppingList, init as initShoppingList } from './ShoppingList';
import { Swatch, init as initSwatch } from './Swatch';
import { SwatchMeasurement, init as initSwatchMeasurement } from './SwatchMeasurement';
import { User, init as initUser } from './User';
import { UserRole, init as initUserRole } from './UserRole';
import { Yarn, init as initYarn } from './Yarn';

for (const init of [
  initAuditEntry,
  initBlanket,
  initBlanketColourLink,
  initBlanketRevision,
  initColourway,
  initDyeLot,
  initEmailToken,
  initMadeMotifRow,
  initMakingTick,
  initMakingWeighing,
  initMotifRow,
  initMotifVersion,
  initOwnStitchRow,
  initPartSkein,
  initShoppingList,
  initSwatch,
  initSwatchMeasurement,
  initUser,
  initUserRole,
  initYarn,
]) {
  init(sequelize);
}

User.hasMany(UserRole, { as: 'roleRows', foreignKey: 'userId' });
User.hasMany(EmailToken, { as: 'emailTokens', foreignKey: 'userId' });

Yarn.hasMany(Colourway, { as: 'colourways', foreignKey: 'yarnId' });
Colourway.belongsTo(Yarn, { as: 'yarn', foreignKey: 'yarnId' });
Colourway.hasMany(DyeLot, { as: 'dyeLots', foreignKey: 'colourwayId' });
DyeLot.belongsTo(Colourway, { as: 'colourway', foreignKey: 'colourwayId' });
DyeLot.hasMany(PartSkein, { as: 'partSkeins', foreignKey: 'dyeLotId' });

Swatch.belongsTo(Yarn, { as: 'yarn', foreignKey: 'yarnId' });
Swatch.hasMany(SwatchMeasurement, { as: 'measurements', foreignKey: 'swatchId' });

Blanket.hasMany(BlanketColourLink, { as: 'colourLinks', foreignKey: 'blanketId' });

export {
  AuditEntry,
  Blanket,
  BlanketColourLink,
  BlanketRevision,
  Colourway,
  DyeLot,
  EmailToken,
  MadeMotifRow,
  MakingTick,
  MakingWeighing,
  MotifRow,
  MotifVersion,
  OwnStitchRow,
  PartSkein,
  sequelize,
  ShoppingList,
  Swatch,
  SwatchMeasurement,
  User,
  UserRole,
  Yarn,
};
