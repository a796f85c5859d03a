import { addPerson, changePerson, changeWorkshop } from '@hidewright/contract';
import { useSend } from '../../lib/use-send.ts';
import { sessionKey } from '../../lib/query-client.ts';

/** The shop's name, units and currency stand in the session as well. */
export function useChangeWorkshop() {
  return useSend(changeWorkshop, {
    invalidates: [['workshop'], sessionKey, ['activities'], ['today']],
  });
}

export function useAddPerson() {
  return useSend(addPerson, { invalidates: [['people'], ['activities']] });
}

export function useChangePerson() {
  return useSend(changePerson, { invalidates: [['people'], ['activities']] });
}
