import { send } from '@/lib/http/client';
import type { AcceptInput, InvitationInput, MemberInput } from '../schema';

const siteUrl = (siteId: string): string => `/api/sites/${encodeURIComponent(siteId)}/people`;
const memberUrl = (siteId: string, person: string): string => `${siteUrl(siteId)}/${encodeURIComponent(person)}`;
const invitationUrl = (siteId: string, invitation: string): string => `${siteUrl(siteId)}/invitations/${encodeURIComponent(invitation)}`;

export const saveMember = (siteId: string, person: string, version: number, input: MemberInput): Promise<unknown> => send('PUT', memberUrl(siteId, person), { body: input, version });

export const takeMemberOff = (siteId: string, person: string, version: number): Promise<unknown> => send('DELETE', memberUrl(siteId, person), { version });

export const invite = (siteId: string, input: InvitationInput): Promise<unknown> => send('POST', `${siteUrl(siteId)}/invitations`, { body: input });

export const inviteAgain = (siteId: string, invitation: string): Promise<unknown> => send('POST', invitationUrl(siteId, invitation));

export const takeInvitationBack = (siteId: string, invitation: string): Promise<unknown> => send('DELETE', invitationUrl(siteId, invitation));

export type Joined = { readonly siteId: string; readonly role: 'owner' | 'chef' | 'installer' | 'trainer' };

export const joinAsNewPerson = (input: AcceptInput): Promise<Joined> => send('POST', '/api/account/invitation', { body: input });

export const join = (token: string): Promise<Joined> => send('POST', '/api/account/invitation/join', { body: { token } });
