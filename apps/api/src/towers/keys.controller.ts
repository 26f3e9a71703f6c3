import { Body, Controller, Delete, Get, HttpCode, Param, ParseIntPipe, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, Roles } from '../auth/decorators';
import type { SignedIn } from '../auth/signed-in';
import { KeyDto, KeyInput, KeyMade } from './dto/key.dto';
import { KeysService } from './keys.service';

/** The keys by which sites push their readings. */
@ApiTags('towers')
@Controller()
export class KeysController {
  constructor(private readonly keys: KeysService) {}

  /** Lists a tower's keys and when each was last used. */
  @Get('towers/:id/keys')
  @Roles('administrator', 'analyst')
  @ApiOkResponse({ type: [KeyDto] })
  list(@Param('id', ParseIntPipe) id: number): Promise<KeyDto[]> {
    return this.keys.list(id);
  }

  /** Makes a key; the answer is the only time it is shown. */
  @Post('towers/:id/keys')
  @Roles('administrator')
  @ApiCreatedResponse({ type: KeyMade })
  create(
    @Param('id', ParseIntPipe) id: number,
    @Body() { name }: KeyInput,
    @CurrentUser() by: SignedIn,
  ): Promise<KeyMade> {
    return this.keys.create(id, name, by);
  }

  /** Revokes a key. */
  @Delete('keys/:id')
  @HttpCode(204)
  @Roles('administrator')
  @ApiNoContentResponse()
  revoke(@Param('id', ParseIntPipe) id: number, @CurrentUser() by: SignedIn): Promise<void> {
    return this.keys.revoke(id, by);
  }
}
