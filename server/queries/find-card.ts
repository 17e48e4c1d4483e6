import { describeCastingState, openCastingStates } from '#shared/domain/casting/casting-state.ts';
import { parseFlaskCode, splitCode } from '#shared/lib/codes.ts';
import { AppError } from '../errors.ts';
import type { Services } from '../services/services.ts';
import { loadCasting, type LoadedCasting } from './load-casting.ts';
import { refuseUnapprovedAlloy } from './refuse-unapproved-alloy.ts';

const isRunning = ({ melt }: LoadedCasting): boolean => melt !== null && melt.overAt === null;

/** Whether there is something for a terminal to do: a card to open, or one that is still running. */
const hasCard = (casting: LoadedCasting): boolean => casting.state === 'holding' || isRunning(casting);

/** Finds what a scanned or typed code means; each way it can fail is one sentence with what to do. */
export const findCard = async (services: Services, text: string): Promise<LoadedCasting> => {
  const { models } = services;
  const parsed = parseFlaskCode(text);
  if (!parsed.ok) throw new AppError('flask-code-refused', parsed.error);
  const { main } = splitCode(parsed.value);
  const flask = await models.Flask.findOne({ where: { code: parsed.value } });
  if (!flask)
    throw new AppError(
      'flask-code-refused',
      `${main} is not one of this studio's flasks. Check the plate, or tell the owner.`,
    );
  const open = await models.Casting.findOne({ where: { flaskId: flask.id, state: [...openCastingStates] } });
  if (!open)
    throw new AppError(
      'no-open-casting',
      `No casting is planned in ${main}. Check the flask, or ask who invested it.`,
    );
  const casting = await loadCasting(services, open.id);
  if (!hasCard(casting)) {
    const reason = casting.stateReason === '' ? '' : ` (${casting.stateReason})`;
    throw new AppError(
      'wrong-state',
      `${main} is ${describeCastingState(casting.state)}${reason}. A card opens when it is holding.`,
    );
  }
  // A card that runs keeps the figures it was opened with, whatever became of the revision since.
  if (!isRunning(casting)) refuseUnapprovedAlloy(casting);
  return casting;
};
