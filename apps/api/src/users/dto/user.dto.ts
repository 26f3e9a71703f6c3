import { ApiProperty } from '@nestjs/swagger';
import { roles, type Role, type UserState } from '@lidwatch/contracts';

/** Somebody who signs in, as the administrator sees them. */
export class UserView {
  @ApiProperty()
  id!: number;
  @ApiProperty()
  email!: string;
  @ApiProperty()
  name!: string;
  @ApiProperty({ enum: roles })
  role!: Role;
  @ApiProperty({ enum: ['invited', 'active', 'retired'] })
  state!: UserState;
  @ApiProperty({ type: [Number], description: 'The districts an officer acts in.' })
  districtIds!: number[];
  @ApiProperty({ format: 'date-time' })
  createdAt!: string;
  @ApiProperty({ format: 'date-time', required: false })
  retiredAt?: string;
}

/** A new account and the link that its owner sets a password with. */
export class InvitedUser {
  @ApiProperty()
  user!: UserView;
  @ApiProperty({ description: 'Works once, for seven days. Hand it to this person only.' })
  invitationUrl!: string;
}

/** A link that its receiver sets a password with. */
export class PasswordLink {
  @ApiProperty({ description: 'Works once, for a day. Hand it to this person only.' })
  url!: string;
}
