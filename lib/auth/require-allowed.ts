import 'server-only';

import { notAllowed } from '../http/app-error';
import { can, permissions, type Action } from './permissions';
import type { GardenActor } from './session';

/** Throws 403 unless the actor's role in this garden allows the action. */
export function requireAllowed(actor: GardenActor, action: Action): void {
  if (!can(actor.role, action)) throw notAllowed(permissions[action].says);
}
