import { Router } from 'express';

import { changeRole, invite, listCrew, listInvitations, removeMember, revokeInvitation } from '@/shared/contracts/crew';
import { route } from '../http/route';
import type { CrewService } from '../services/crew-service';
import type { InvitationService } from '../services/invitation-service';

export function crewRoutes(crew: CrewService, invitations: InvitationService): Router {
  const router = Router();
  route(router, listCrew, 200, ({ actor }) => crew.list(actor));
  route(router, changeRole, 200, ({ actor, params, body }) => crew.changeRole(actor, params.personId, body.role));
  route(router, removeMember, 204, ({ actor, params }) => crew.remove(actor, params.personId));
  route(router, listInvitations, 200, ({ actor }) => invitations.list(actor));
  route(router, invite, 201, ({ actor, body }) => invitations.invite(actor, body.email, body.role));
  route(router, revokeInvitation, 204, ({ actor, params }) => invitations.revoke(actor, params.invitationId));
  return router;
}
