import { Module } from '@nestjs/common';
import { ServeStaticModule } from '@nestjs/serve-static';
import type { Response } from 'express';
import { existsSync } from 'node:fs';
import path from 'node:path';
import { Settings } from '../config/settings';

const aYearS = 365 * 24 * 3600;

/** The built web application; its pages' addresses all answer index.html, a missing file or API address does not. */
@Module({
  imports: [
    ServeStaticModule.forRootAsync({
      inject: [Settings],
      useFactory: ({ webDir }: Settings) =>
        existsSync(path.join(webDir, 'index.html'))
          ? [
              {
                rootPath: webDir,
                exclude: ['/api', '/api/{*path}', '/feeds/{*path}', '/health/{*path}', '/assets/{*path}'],
                serveStaticOptions: { setHeaders: setCaching, fallthrough: true },
              },
            ]
          : [],
    }),
  ],
})
export class WebFilesModule {}

/** Built assets carry their hash in the name and never change; a page is asked for anew each time. */
function setCaching(response: Response, file: string): void {
  const built = file.includes(`${path.sep}assets${path.sep}`);
  response.setHeader('Cache-Control', built ? `public, max-age=${aYearS}, immutable` : 'no-cache');
}
