import { ApiProperty } from '@nestjs/swagger';
import { roles, type Role } from '@lidwatch/contracts';

/** A district by name. */
export class MyDistrict {
  @ApiProperty()
  id!: number;
  @ApiProperty()
  slug!: string;
  @ApiProperty()
  name!: string;
}

/** The signed-in person. */
export class Me {
  @ApiProperty()
  id!: number;
  @ApiProperty()
  name!: string;
  @ApiProperty()
  email!: string;
  @ApiProperty({ enum: roles })
  role!: Role;
  @ApiProperty({
    type: () => [MyDistrict],
    description: "An officer's own districts; every district for the others.",
  })
  districts!: MyDistrict[];
}

/** What a link is for, for the page it opens. */
export class LinkView {
  @ApiProperty({ enum: ['first-administrator', 'invitation', 'password'] })
  purpose!: 'first-administrator' | 'invitation' | 'password';
  @ApiProperty({ required: false })
  email?: string;
  @ApiProperty({ required: false })
  name?: string;
}
