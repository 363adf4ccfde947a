import { send } from '@/lib/http/client';

export const sendNewPassword = (current: string, next: string): Promise<unknown> => send('POST', '/api/account/password', { body: { current, next } });
