import type { QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { DeviceChoices } from '../features/account/DeviceChoices.tsx';
import { PasswordForm } from '../features/account/PasswordForm.tsx';
import { useSession } from '../lib/session.ts';
import { signedInLoader } from '../lib/signed-in-loader.ts';
import { PageTitle } from '../ui/PageTitle.tsx';
import { PersonMark } from '../ui/PersonMark.tsx';

export const accountLoader = (queryClient: QueryClient) => signedInLoader(queryClient);

export function AccountPage() {
  const { person, role, workshop } = useSession();
  return (
    <div className="px-margin pt-4 pb-12">
      <PageTitle>Account</PageTitle>
      <h1 className="text-page max-bar:sr-only font-semibold">Account</h1>
      <div className="lying:grid-cols-2 mt-4 grid gap-x-20 gap-y-10">
        <div className="grid content-start gap-10">
          <Part title="You">
            <div className="flex items-center gap-4">
              <PersonMark name={person.name} size={44} />
              <p>
                <span className="text-row block font-semibold">{person.name}</span>
                <span className="text-ink2 block break-all">{person.email}</span>
                <span className="text-data text-ink3 block">
                  {role} at {workshop.name}
                </span>
              </p>
            </div>
          </Part>
          <Part title="Password">
            <PasswordForm email={person.email} />
          </Part>
        </div>
        <Part title="On this device">
          <DeviceChoices workshopUnit={workshop.unit} />
        </Part>
      </div>
    </div>
  );
}

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="self-start">
      <h2 className="border-hair text-section mb-4 border-b pb-1 font-semibold">{title}</h2>
      {children}
    </section>
  );
}
