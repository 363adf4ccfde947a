'use client';

import dynamic from 'next/dynamic';

/** Forms arrive when a panel is opened, not with the page. */
export const MemberPanelLoader = dynamic(() => import('./member-panel').then(({ MemberPanel }) => MemberPanel), { ssr: false });
export const InvitePanelLoader = dynamic(() => import('./invite-panel').then(({ InvitePanel }) => InvitePanel), { ssr: false });
