import type { FieldErrors } from '../../components/use-form.ts';

export interface SiteFields {
  readonly name: string;
  readonly address: string;
  readonly time_zone: string;
}

/** What is wrong with the fields of a site. */
export function siteErrors(values: SiteFields): FieldErrors<SiteFields> {
  return {
    name: values.name.trim() === '' ? 'Enter the name of the site' : tooLong('The name', values.name, 200),
    address: tooLong('The address', values.address, 500),
  };
}

function tooLong(what: string, text: string, most: number): string | undefined {
  const length = text.trim().length;
  return length > most ? `${what} must be ${most} characters or fewer; it has ${length}` : undefined;
}
