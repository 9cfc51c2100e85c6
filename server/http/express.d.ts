/** The signed-in person that passport puts on a request. */
import 'passport';
import type { Actor } from './actor';

declare global {
  namespace Express {
    interface User extends Actor {
      /** Present while signing in: which password and roles the session was opened under. */
      epoch?: number;
    }
  }
}
