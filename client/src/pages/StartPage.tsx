import { Link, useNavigate } from 'react-router';
import { CreateWorkshopForm } from '../features/session/CreateWorkshopForm.tsx';
import { paths } from '../paths.ts';
import { PageTitle } from '../ui/PageTitle.tsx';
import { PlainFrame } from './PlainFrame.tsx';

export function StartPage() {
  const navigate = useNavigate();
  return (
    <PlainFrame>
      <PageTitle>Create a workshop</PageTitle>
      <div className="px-margin mx-auto w-full max-w-140 py-8">
        <h1 className="text-page font-semibold">Create a workshop</h1>
        <p className="text-ink2 mt-1 mb-6">
          You become its owner. The workshop&rsquo;s name can be changed later. You have one already?{' '}
          <Link to={paths.signIn()} className="text-link whitespace-nowrap">
            Sign in
          </Link>
        </p>
        <CreateWorkshopForm onCreated={() => void navigate(paths.today(), { replace: true })} />
      </div>
    </PlainFrame>
  );
}
