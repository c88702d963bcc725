import { signUp as contract } from '@embertally/shared/contracts/organisations';
import { call } from '../../../lib/api-client.ts';

export interface SignUpInput {
  readonly id: string;
  readonly organisation_name: string;
  readonly name: string;
  readonly email: string;
  readonly password: string;
}

/** Makes an organisation and its first member. The answer does not tell whether the address had an account before. */
export async function signUp(input: SignUpInput): Promise<void> {
  await call(contract, { body: input });
}
