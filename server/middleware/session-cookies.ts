import type { CookieOptions, Response } from 'express';
import type { ServerConfig } from '../config';
import type { Issued } from '../services/sessions';

export const ACCESS_COOKIE = 'benchleaf_access';
export const REFRESH_COOKIE = 'benchleaf_refresh';

/** Scripts cannot read them and other sites cannot send them; the refresh token goes to the sign-in's own address only. */
export function setSessionCookies(response: Response, config: ServerConfig, issued: Issued): void {
  response.cookie(ACCESS_COOKIE, issued.access, {
    ...options(config),
    path: '/api',
    maxAge: config.accessLife,
  });
  if (issued.refresh === undefined) return;
  response.cookie(REFRESH_COOKIE, issued.refresh, {
    ...options(config),
    path: '/api/session',
    maxAge: config.refreshLife,
  });
}

export function clearSessionCookies(response: Response, config: ServerConfig): void {
  response.clearCookie(ACCESS_COOKIE, { ...options(config), path: '/api' });
  response.clearCookie(REFRESH_COOKIE, { ...options(config), path: '/api/session' });
}

function options(config: ServerConfig): CookieOptions {
  return { httpOnly: true, sameSite: 'strict', secure: config.secureCookies };
}
