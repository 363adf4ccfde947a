import { send } from '@/lib/http/client';
import type { ChangePasswordInput } from '../schema';

export const changePassword = (input: ChangePasswordInput): Promise<unknown> => send('POST', '/api/account/password', { body: input });
