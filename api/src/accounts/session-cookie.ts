import type { CookieOptions } from 'express';
import { env } from '../config/env';

const { protocol, hostname } = new URL(env.PUBLIC_URL);

/** Browsers keep Secure cookies over HTTPS and on loopback, nowhere else. */
const isTrustworthy = protocol === 'https:' || ['127.0.0.1', 'localhost', '[::1]'].includes(hostname);

export const SESSION_COOKIE = isTrustworthy ? '__Host-brimgate-session' : 'brimgate-session';

export const sessionCookieOptions: CookieOptions = {
  httpOnly: true,
  sameSite: 'strict',
  secure: isTrustworthy,
  path: '/',
};
