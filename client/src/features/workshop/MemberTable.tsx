import type { z } from 'zod';
import type { membersSchema } from '#shared/contract/session.ts';
import { PersonMark } from '../../ui/PersonMark.tsx';
import { ROLE_WORDS } from './role-words.ts';

type Members = z.infer<typeof membersSchema>['items'];

interface MemberTableProps {
  members: Members;
  /** "today 11:32" */
  printWhen: (at: string) => string;
}

export function MemberTable({ members, printWhen }: MemberTableProps) {
  return (
    <table className="w-full border-collapse text-left">
      <caption className="sr-only">People of this workshop</caption>
      <thead className="text-label text-ink3">
        <tr>
          <th scope="col" className="h-8 pr-3 font-normal">
            Person
          </th>
          <th scope="col" className="h-8 px-3 font-normal">
            Role
          </th>
          <th scope="col" className="max-tablet:hidden h-8 pl-3 font-normal">
            Last here
          </th>
        </tr>
      </thead>
      <tbody>
        {members.map((member) => (
          <tr key={member.id} className="border-hair border-y">
            <th scope="row" className="h-13.5 py-1.5 pr-3 font-normal">
              <span className="flex items-center gap-3.5">
                <PersonMark name={member.name} size={32} />
                <span className="min-w-0">
                  <span className="block font-semibold break-words">{member.name}</span>
                  <span className="text-ink3 block text-[13.5px] leading-4.25 break-all">{member.email}</span>
                </span>
              </span>
            </th>
            <td className="px-3">{ROLE_WORDS[member.role]}</td>
            <td className="text-ink2 max-tablet:hidden pl-3">
              {member.lastHereAt === null ? 'not yet' : printWhen(member.lastHereAt)}
            </td>
          </tr>
        ))}
      </tbody>
    </table>
  );
}
