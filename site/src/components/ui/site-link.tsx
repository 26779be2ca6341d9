import type { ReactNode } from 'react';
import { Link, useSearchParams } from 'react-router-dom';
import { isUnit } from '../../lib/range-boxes';

interface SiteLinkProps {
  readonly to: string;
  readonly className?: string;
  readonly children: ReactNode;
  readonly 'aria-label'?: string;
  readonly 'aria-current'?: 'page' | 'true' | undefined;
  readonly rel?: string;
}

/** A link within the site. A unit that stands in the address goes along, so that it also holds without a script. */
export function SiteLink({ to, ...rest }: SiteLinkProps) {
  const [params] = useSearchParams();
  return <Link to={keepingUnit(to, params.get('unit'))} {...rest} />;
}

export function keepingUnit(to: string, unit: string | null): string {
  if (!isUnit(unit)) return to;
  const [, path = '', query = '', hash = ''] = /^([^?#]*)\??([^#]*)(#.*)?$/.exec(to) ?? [];
  const params = new URLSearchParams(query);
  params.set('unit', unit);
  params.sort();
  return `${path}?${params.toString()}${hash}`;
}
