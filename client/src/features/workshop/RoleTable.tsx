import { ROLES, type Role } from '#shared/contract/session.ts';
import { permissionRefusal, type Action } from '#shared/rules/permissions.ts';
import { classNames } from '../../ui/class-names.ts';
import { ROLE_WORDS } from './role-words.ts';

const ROWS: readonly (readonly [Action, string])[] = [
  ['create-design', 'Make new designs'],
  ['edit-design', 'Change designs'],
  ['archive-design', 'Put designs in the archive'],
  ['print-sheet', 'Print drilling sheets'],
  ['see-members', 'See who is here'],
  ['change-workshop', 'Change the defaults'],
];

/** Asks the same rules as every button and every route, so that it cannot say anything else than they do. */
export function RoleTable({ ownRole }: { ownRole: Role }) {
  return (
    <section aria-labelledby="what-roles-may" className="max-w-195">
      <h2 id="what-roles-may" className="text-section font-semibold">
        What each role may do{' '}
        <span className="text-data text-ink3 ml-2 font-normal">covered: yes, open: no</span>
      </h2>
      <table className="mt-1.5 w-full border-collapse text-[14.5px]">
        <thead>
          <tr className="text-ink3 text-small tablet:text-[13.5px]">
            <td />
            {ROLES.map((role) => (
              <th
                key={role}
                scope="col"
                className={classNames(
                  'tablet:min-w-20 h-7 px-0.5 font-normal',
                  role === ownRole && 'bg-mark-soft text-mark font-semibold',
                )}
              >
                {ROLE_WORDS[role]}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {ROWS.map(([action, words]) => (
            <tr key={action} className="border-hair border-t">
              <th
                scope="row"
                className="tablet:pr-4 tablet:whitespace-nowrap h-6.5 pr-1 text-left leading-tight font-normal"
              >
                {words}
              </th>
              {ROLES.map((role) => (
                <td key={role} className={classNames('text-center', role === ownRole && 'bg-mark-soft')}>
                  <MayDo isAllowed={permissionRefusal({ role }, action) === null} />
                </td>
              ))}
            </tr>
          ))}
        </tbody>
      </table>
    </section>
  );
}

/** Read like a finger hole. */
function MayDo({ isAllowed }: { isAllowed: boolean }) {
  return (
    <>
      <svg
        width="14"
        height="14"
        viewBox="0 0 14 14"
        aria-hidden="true"
        className="inline-block align-[-2px]"
      >
        <circle
          cx="7"
          cy="7"
          r="5.6"
          fill={isAllowed ? 'var(--ink)' : 'var(--sheet)'}
          stroke="var(--ink)"
          strokeWidth="1.2"
        />
      </svg>
      <span className="sr-only">{isAllowed ? 'yes' : 'no'}</span>
    </>
  );
}
