/** electron-builder's configuration: what is packed, for which machines, with which fuses. */
export default {
  appId: 'org.barwright.app',
  productName: 'Barwright',
  copyright: 'Barwright authors, MIT',
  directories: { output: 'dist', buildResources: 'packaging' },
  // Everything is bundled into out/, so no package goes along. The samples are in it for the page, and
  // beside it for the user.
  files: ['out/main/**', 'out/preload/**', 'out/renderer/**', 'samples/**', 'package.json', 'LICENSE'],
  extraResources: [{ from: 'samples', to: 'samples' }],
  asar: true,
  npmRebuild: false,
  publish: null,
  electronFuses: {
    runAsNode: false,
    enableCookieEncryption: true,
    enableNodeOptionsEnvironmentVariable: false,
    enableNodeCliInspectArguments: false,
    enableEmbeddedAsarIntegrityValidation: true,
    onlyLoadAppFromAsar: true,
    loadBrowserProcessSpecificV8Snapshot: false,
    grantFileProtocolExtraPrivileges: false,
  },
  linux: {
    target: ['AppImage', 'deb'],
    category: 'Science',
    icon: 'packaging/icons',
    maintainer: 'Barwright authors',
  },
  win: { target: ['nsis'], icon: 'packaging/icon.ico' },
  nsis: { oneClick: false, perMachine: false, allowToChangeInstallationDirectory: true },
  mac: { target: ['dmg'], category: 'public.app-category.utilities', icon: 'packaging/icons/512x512.png' },
}
