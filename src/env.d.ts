import type { Viewer } from '#src/access/viewer.ts';

declare global {
  namespace App {
    interface Locals {
      viewer: Viewer | null;
    }
  }
}
