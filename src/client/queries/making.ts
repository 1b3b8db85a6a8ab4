import { makingSchema, type Making, type MakingInput } from '../../schemas/making';
import { get, post } from '../api';

const pathOf = (blanketId: string): string => `/api/blankets/${blanketId}/making`;

export const getMaking = (blanketId: string): Promise<Making> =>
  get(pathOf(blanketId), makingSchema);

/** Sends what was marked here and answers with everything marked on every device. */
export const sendMarks = (blanketId: string, marks: MakingInput): Promise<Making> =>
  post(pathOf(blanketId), marks, makingSchema);
