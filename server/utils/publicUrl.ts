/** Where people reach the house: the origin of AUTH_ORIGIN. */
export function publicUrl(env: NodeJS.ProcessEnv = process.env): string {
  const given = env.AUTH_ORIGIN || env.NEXTAUTH_URL
  return given && URL.canParse(given) ? new URL(given).origin : `http://${env.HOST || '127.0.0.1'}:${env.PORT || '3000'}`
}

/** True when people reach the house over https: cookies are then Secure and bound to the host. */
export const isSecure = (env: NodeJS.ProcessEnv = process.env): boolean => publicUrl(env).startsWith('https://')
