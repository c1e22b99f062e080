import 'next-auth'
import 'next-auth/jwt'

declare module 'next-auth' {
  interface Session { user: { id: string, name: string, email: string } }
  interface User { id: string, sid: string }
}
declare module 'next-auth/jwt' {
  interface JWT { uid?: string, sid?: string }
}
