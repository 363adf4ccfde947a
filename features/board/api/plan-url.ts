export const plansUrl = (siteId: string): string => `/api/sites/${encodeURIComponent(siteId)}/plans`;

export const planUrl = (siteId: string, planId: string): string => `${plansUrl(siteId)}/${encodeURIComponent(planId)}`;
