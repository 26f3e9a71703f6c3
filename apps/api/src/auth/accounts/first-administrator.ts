import { Injectable, Logger, type OnApplicationBootstrap } from '@nestjs/common';
import { Settings } from '../../config/settings';
import { UsersService } from '../../users/users.service';
import { LinkTokens } from '../links/link-tokens';

/** On an empty installation without the demo: makes the link the first administrator begins with, and prints it. */
@Injectable()
export class FirstAdministratorLink implements OnApplicationBootstrap {
  private readonly logger = new Logger('FirstAdministrator');

  constructor(
    private readonly settings: Settings,
    private readonly users: UsersService,
    private readonly links: LinkTokens,
  ) {}

  async onApplicationBootstrap(): Promise<void> {
    const url = await this.makeIfNeeded();
    if (url)
      this.logger.warn(
        `There is no user yet. The first administrator begins here (once, within a day): ${url}`,
      );
  }

  /** A new link, or undefined when there is somebody already or the demo brings its own people. */
  async makeIfNeeded(): Promise<string | undefined> {
    if (this.settings.demo || (await this.users.count()) > 0) return undefined;
    return this.links.make('first-administrator', null);
  }
}
