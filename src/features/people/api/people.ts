import { queryOptions, useQueryClient } from '@tanstack/react-query';
import { useCallback, useRef } from 'react';
import { api, newIdempotencyKey } from '#src/lib/api/client.ts';
import type {
  Organisation,
  OrganisationNew,
  Person,
  PersonChange,
  PersonNew,
} from '#shared/generated/api-types.ts';

export const personQuery = (id: string) =>
  queryOptions({
    queryKey: ['people', 'one', id],
    queryFn: ({ signal }) => api<Person>(`/api/people/${id}`, { signal }),
  });

/** Invites a person or adds a contractor: the same sent twice is made once. */
function useCreate<Body, Made>(path: string): (body: Body) => Promise<Made> {
  const client = useQueryClient();
  const intent = useRef({ text: '', key: '' });
  return useCallback(
    async (body) => {
      const text = JSON.stringify(body);
      if (intent.current.text !== text) intent.current = { text, key: newIdempotencyKey() };
      const made = await api<Made>(path, { method: 'POST', body, idempotencyKey: intent.current.key });
      await Promise.all([
        client.invalidateQueries({ queryKey: ['people'] }),
        client.invalidateQueries({ queryKey: ['organisations'] }),
      ]);
      return made;
    },
    [client, path],
  );
}

export const useInvitePerson = () => useCreate<PersonNew, Person>('/api/people');
export const useAddOrganisation = () => useCreate<OrganisationNew, Organisation>('/api/organisations');

/** Changes a person as last seen; refused when somebody else changed them since. */
export function useChangePerson() {
  const client = useQueryClient();
  return useCallback(
    async (person: Person, change: PersonChange): Promise<Person> => {
      const changed = await api<Person>(`/api/people/${person.id}`, {
        method: 'PATCH',
        body: change,
        ifMatch: person.version,
      });
      await client.invalidateQueries({ queryKey: ['people'] });
      return changed;
    },
    [client],
  );
}

export function sendInvitationAgain(person: Person): Promise<void> {
  return api<void>(`/api/people/${person.id}/invitation`, { method: 'POST' });
}
