import { Op } from 'sequelize';
import { furnaceRoles } from '#shared/domain/people/role.ts';
import { notFound } from '../errors.ts';
import type { User } from '../models/user.ts';
import type { Services } from '../services/services.ts';

/** One person. */
export const loadPerson = async ({ models }: Services, id: string): Promise<User> => {
  const user = await models.User.findByPk(id);
  if (!user) throw notFound('person');
  return user;
};

/** Everyone, by name. */
export const listPeople = ({ models }: Services): Promise<User[]> =>
  models.User.findAll({ order: [['name', 'ASC']] });

/** Those who may sign in at a terminal, by name. */
export const listPeopleAtTerminal = ({ models }: Services): Promise<User[]> =>
  models.User.findAll({
    where: { active: true, pinHash: { [Op.ne]: null }, roles: { [Op.overlap]: [...furnaceRoles] } },
    order: [['name', 'ASC']],
  });
