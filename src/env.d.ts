/// <reference types="astro/client" />

declare namespace App {
  interface Locals {
    viewer: import('#src/access/viewer.ts').Viewer | null;
  }
}
