/** Stands beside every signature as evidence. */
export interface RequestOrigin {
  ip: string;
  userAgent: string;
}

/** From where a request came, for the evidence; what is not known is said so, never left empty. */
export const requestOrigin = (request: Request): RequestOrigin => ({
  ip: request.headers.get('x-forwarded-for')?.split(',')[0]?.trim() || 'not recorded',
  userAgent: request.headers.get('user-agent') || 'not recorded',
});
