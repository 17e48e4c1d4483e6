import { Op } from 'sequelize';
import type { Services } from '../services/services.ts';

/** Sends a notice to every owner who has an e-mail address. */
export const tellOwners = async (
  { models, mailer }: Services,
  { subject, text }: { readonly subject: string; readonly text: string },
): Promise<void> => {
  const owners = await models.User.findAll({
    where: { active: true, roles: { [Op.contains]: ['owner'] }, email: { [Op.ne]: null } },
  });
  const to = owners.flatMap(({ email }) => email ?? []);
  if (to.length > 0) await mailer({ to, subject, text });
};
