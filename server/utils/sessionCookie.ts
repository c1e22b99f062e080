import { isSecure } from './publicUrl'

/** The session's cookie. Over https its name binds it to this host and path, so that a neighbour's host cannot set it. */
export function sessionCookie(env: NodeJS.ProcessEnv = process.env) {
  const secure = isSecure(env)
  return { name: `${secure ? '__Host-' : ''}next-auth.session-token`, options: { httpOnly: true, sameSite: 'lax', path: '/', secure } } as const
}
