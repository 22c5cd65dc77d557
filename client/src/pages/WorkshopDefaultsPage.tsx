import type { QueryClient } from '@tanstack/react-query';
import { permissionRefusal } from '#shared/rules/permissions.ts';
import { DefaultsForm } from '../features/workshop/DefaultsForm.tsx';
import { DefaultsSheet } from '../features/workshop/DefaultsSheet.tsx';
import { useSession } from '../lib/session.ts';
import { signedInLoader } from '../lib/signed-in-loader.ts';
import { WorkshopFrame } from './WorkshopFrame.tsx';

export const workshopDefaultsLoader = (queryClient: QueryClient) => signedInLoader(queryClient);

export function WorkshopDefaultsPage() {
  const session = useSession();
  const refusal = permissionRefusal(session, 'change-workshop');
  return (
    <WorkshopFrame title="Defaults">
      {refusal === null ? (
        <DefaultsForm workshop={session.workshop} />
      ) : (
        <DefaultsSheet workshop={session.workshop} refusal={refusal} />
      )}
    </WorkshopFrame>
  );
}
