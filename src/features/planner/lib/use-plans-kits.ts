import { useUser } from '#src/lib/session/session.ts';

/** Who plans kits: contractors for their orders, and the administrator who orders for all. */
export function usePlansKits(): boolean {
  const { role } = useUser();
  return role === 'contractor' || role === 'administrator';
}
