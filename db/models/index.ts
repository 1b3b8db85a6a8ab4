import { sequelize } from '../connection';
import { AuditEntry, init as initAuditEntry } from './AuditEntry';
import { EmailToken, init as initEmailToken } from './EmailToken';
import { User, init as initUser } from './User';
import { UserRole, init as initUserRole } from './UserRole';

for (const init of [initAuditEntry, initEmailToken, initUser, initUserRole]) init(sequelize);

User.hasMany(UserRole, { as: 'roleRows', foreignKey: 'userId' });
User.hasMany(EmailToken, { as: 'emailTokens', foreignKey: 'userId' });

export { AuditEntry, EmailToken, sequelize, User, UserRole };
