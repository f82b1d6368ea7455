# The whole application in one image: pages, API, and the mail catcher that the demonstration uses.

FROM node:20-bookworm-slim AS tools
# The SQLite binding is compiled against the headers that lie beside this Node.
RUN apt-get update \
  && DEBIAN_FRONTEND=noninteractive apt-get install -y --no-install-recommends make g++ python3 \
  && rm -rf /var/lib/apt/lists/*
ENV npm_config_nodedir=/usr/local SCARF_ANALYTICS=false
WORKDIR /resistry
COPY .npmrc .prebuild-installrc package.json package-lock.json ./
COPY backend/engineering/package.json backend/engineering/
COPY backend/package.json backend/
COPY frontend/package.json frontend/
COPY e2e/package.json e2e/

FROM tools AS packages
RUN npm ci --omit=dev --workspace backend/engineering --workspace backend

FROM tools AS build
RUN npm ci --include=dev
COPY tsconfig.base.json ./
COPY scripts scripts
COPY backend backend
COPY frontend frontend
RUN npm run build

FROM node:20-bookworm-slim
WORKDIR /resistry
COPY --from=packages /resistry ./
COPY --from=build /resistry/backend/engineering/dist backend/engineering/dist
COPY --from=build /resistry/backend/dist backend/dist
COPY --from=build /resistry/frontend/dist frontend/dist
COPY seed-data seed-data
# The mail has a folder that the mail catcher can share without reaching the database.
RUN mkdir -p /data/mail && chown -R node:node /data
USER node
# Without MALLOC_ARENA_MAX the C library keeps a heap for every thread, and none is ever given back.
ENV NODE_ENV=production HOST=0.0.0.0 PORT=3000 DATA_DIR=/data MALLOC_ARENA_MAX=2
VOLUME /data
EXPOSE 3000
HEALTHCHECK --interval=30s --timeout=5s --start-period=90s \
  CMD ["node", "-e", "fetch(`http://127.0.0.1:${process.env.PORT}/api/health`).then((answer) => process.exit(answer.ok ? 0 : 1), () => process.exit(1))"]
CMD ["node", "backend/dist/main.js"]
