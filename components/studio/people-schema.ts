/** What the people page is drawn from; lib/people/list.ts reads it. */
export interface Member {
  personId: string;
  name: string;
  email: string;
  role: string;
  since: string;
}

export interface PendingInvitation {
  id: string;
  name: string;
  email: string;
  role: string | null;
  by: string;
  expiresAt: string;
}

export interface ProductionPeople {
  id: string;
  code: string;
  name: string;
  kind: string;
  members: Member[];
  invitations: PendingInvitation[];
}

export interface Account {
  id: string;
  name: string;
  email: string;
  isOwner: boolean;
}
