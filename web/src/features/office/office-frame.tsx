import type { ReactNode } from 'react';
import { NavLink } from 'react-router-dom';
import { sitePaths } from '#shared/site-paths.ts';
import { Page } from '#web/ui/page.tsx';

const rooms = [
  { to: sitePaths.officeOrders, label: 'Orders' },
  { to: sitePaths.officeMoney, label: 'Money' },
  { to: sitePaths.officeMembers, label: 'Members' },
  { to: sitePaths.officeAudit, label: 'Record' },
];

/** The frame of the office's rooms. */
export function OfficeFrame({ title, sub, children }: { title: string; sub: string; children: ReactNode }) {
  return (
    <Page title={title} sub={sub}>
      <nav aria-label="Office" className="mb-6 flex flex-wrap gap-x-6 border-b border-rule">
        {rooms.map(({ to, label }) => (
          <NavLink
            key={to}
            to={to}
            end
            className={({ isActive }) =>
              `flex min-h-11 items-center border-b-3 font-medium ${isActive ? 'border-copper' : 'border-transparent'}`
            }
          >
            {label}
          </NavLink>
        ))}
      </nav>
      {children}
    </Page>
  );
}
