import { canInstallPackages, findOnPath, installPackage } from './debian.mjs';

/** The path of a Chromium for the end-to-end tests; installs Debian's package when there is none. */
export function chromium() {
  const found = find();
  if (found) return found;
  if (!canInstallPackages()) {
    throw new Error(
      'The end-to-end tests need Chromium, which is not installed: sudo apt-get install chromium',
    );
  }
  installPackage('chromium');
  const installed = find();
  if (!installed)
    throw new Error('The Debian package chromium is installed, but there is no program chromium on PATH.');
  return installed;
}

function find() {
  return findOnPath('chromium') ?? findOnPath('chromium-browser') ?? findOnPath('google-chrome');
}
