import type { ToolReply } from '@hidewright/contract';

/** A day that was typed before the tool became the shop's own is not sent. */
export function ofItsOwner<Body extends { ownedBy?: ToolReply['ownedBy'] | undefined }>(
  body: Body,
): Body {
  return body.ownedBy === 'shop' ? { ...body, keptUntil: null } : body;
}
