/// <reference types="astro/client" />

declare namespace App {
  interface Locals {
    user: import('./schemas/user').CurrentUser | null;
    preferences: import('./schemas/preferences').Preferences;
  }
}
