import { z } from 'zod';

import { ROLES } from '../roles/roles';
import { contract } from './contract';
import { email, moment, uuid } from './fields';

export const crewMemberSchema = z.strictObject({
  personId: uuid,
  name: z.string(),
  email: z.string(),
  role: z.enum(ROLES),
  joinedAt: moment,
});

export const crewSchema = z.strictObject({ members: z.array(crewMemberSchema) });

export type CrewMember = z.infer<typeof crewMemberSchema>;
export type Crew = z.infer<typeof crewSchema>;

export const listCrew = contract({
  method: 'get',
  path: '/crew',
  summary: 'The people of the shop in the order of joining.',
  may: 'crew.see',
  response: crewSchema,
  problems: [],
});

const memberParams = z.strictObject({ personId: uuid });

export const changeRole = contract({
  method: 'patch',
  path: '/crew/:personId',
  summary: 'Give somebody of the crew another role.',
  may: 'crew.edit',
  params: memberParams,
  body: z.strictObject({ role: z.enum(ROLES) }),
  response: crewMemberSchema,
  problems: ['not_found', 'last_owner'],
});

export const removeMember = contract({
  method: 'delete',
  path: '/crew/:personId',
  summary: 'Take somebody out of the crew and end their sign-ins here; what they did stays theirs.',
  may: 'crew.edit',
  params: memberParams,
  response: null,
  problems: ['not_found', 'last_owner'],
});

export const invitationSchema = z.strictObject({
  id: uuid,
  email: z.string(),
  role: z.enum(ROLES),
  createdAt: moment,
  expiresAt: moment,
});

export type Invitation = z.infer<typeof invitationSchema>;

export const invite = contract({
  method: 'post',
  path: '/crew/invitations',
  summary: 'Send somebody a mail with a link to join the shop.',
  may: 'crew.edit',
  creates: true,
  body: z.strictObject({ email, role: z.enum(ROLES) }),
  response: invitationSchema,
  problems: ['already_in_crew'],
});

export const listInvitations = contract({
  method: 'get',
  path: '/crew/invitations',
  summary: 'Invitations nobody has accepted yet.',
  may: 'crew.edit',
  response: z.strictObject({ invitations: z.array(invitationSchema) }),
  problems: [],
});

export const revokeInvitation = contract({
  method: 'delete',
  path: '/crew/invitations/:invitationId',
  summary: 'Take an invitation back; its link stops working.',
  may: 'crew.edit',
  params: z.strictObject({ invitationId: uuid }),
  response: null,
  problems: ['not_found'],
});
