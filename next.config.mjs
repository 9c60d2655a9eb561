/** @type {import('next').NextConfig} */
const config = {
  // Tests build into a folder of their own, so that they may run beside a started workroom.
  distDir: process.env.NEXT_DIST_DIR || '.next',
  poweredByHeader: false,
  reactStrictMode: true,
  // A page comes with its title, whoever asks: a screen reader reads it out the moment the page changes, and a title that
  // follows later is never heard.
  htmlLimitedBots: /.*/,
  serverExternalPackages: ['sequelize', 'mariadb', 'umzug', '@node-rs/argon2', 'pino', 'nodemailer'],
  typescript: {
    // `npm run check` checks every type, tests and scripts included; a build does not do it a second time.
    ignoreBuildErrors: true,
    // The framework adds the types of its build folder to this file: those of a test build stay out of the main one.
    tsconfigPath: process.env.NEXT_DIST_DIR === '.next-test' ? 'tsconfig.test-build.json' : 'tsconfig.json',
  },
}

export default config
