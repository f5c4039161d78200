/** Written into the service worker by the build. */
declare const OFFLINE_FILES: string[];
declare const OFFLINE_VERSION: string;
