import { Op, type WhereOptions } from 'sequelize';
import { AuditEntry, User } from '../../../db/models';
import {
  AUDIT_ENTRIES_PER_PAGE,
  PEOPLE_PER_PAGE,
  type Audit,
  type People,
  type PeopleQuery,
  type Person,
} from '../../schemas/people';
import { presentAuditEntry, presentPerson } from '../presenters/people';

const COLUMN_OF_SORT = { name: 'name', email: 'email', registered: 'createdAt' } as const;

/** One page of the people whose name or address holds the searched text. */
export async function listPeople(query: PeopleQuery): Promise<People> {
  const { search, sort, direction, page } = query;
  const where = searchCondition(search);
  const totalCount = await User.count({ where });
  const rows = await User.findAll({
    where,
    include: { association: 'roleRows', separate: true },
    order: [[COLUMN_OF_SORT[sort], direction === 'up' ? 'ASC' : 'DESC'], 'id'],
    limit: PEOPLE_PER_PAGE,
    offset: (page - 1) * PEOPLE_PER_PAGE,
  });
  return {
    people: rows.map(presentPerson),
    totalCount,
    page,
    pageCount: Math.max(1, Math.ceil(totalCount / PEOPLE_PER_PAGE)),
  };
}

/** One person; null for an id that nobody has. */
export async function findPerson(id: string): Promise<Person | null> {
  const row = await User.findByPk(id, { include: 'roleRows' });
  return row && presentPerson(row);
}

function searchCondition(search: string): WhereOptions<User> {
  if (search === '') return {};
  // The characters that LIKE gives a meaning, taken as themselves.
  const pattern = `%${search.replace(/[\\%_]/g, '\\$&')}%`;
  return { [Op.or]: [{ name: { [Op.iLike]: pattern } }, { email: { [Op.iLike]: pattern } }] };
}

/** One page of the changes made to accounts, or to one, newest first. */
export async function listAudit(page: number, subjectId?: string): Promise<Audit> {
  const where = subjectId === undefined ? {} : { subjectId };
  const totalCount = await AuditEntry.count({ where });
  const rows = await AuditEntry.findAll({
    where,
    order: [
      ['createdAt', 'DESC'],
      ['id', 'ASC'],
    ],
    limit: AUDIT_ENTRIES_PER_PAGE,
    offset: (page - 1) * AUDIT_ENTRIES_PER_PAGE,
  });
  return {
    entries: rows.map(presentAuditEntry),
    totalCount,
    page,
    pageCount: Math.max(1, Math.ceil(totalCount / AUDIT_ENTRIES_PER_PAGE)),
  };
}
