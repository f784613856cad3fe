# syntax=docker/dockerfile:1
# Image of the server. Places without a container registry pass stand-in base images (deploy/make-base-images.sh) as build arguments.
ARG SDK_IMAGE=mcr.microsoft.com/dotnet/sdk:10.0
ARG RUNTIME_IMAGE=mcr.microsoft.com/dotnet/aspnet:10.0-noble-chiseled

FROM ${SDK_IMAGE} AS build
WORKDIR /source
# Project files first, so that the restored packages are a layer of their own.
COPY global.json Directory.Build.props Directory.Packages.props ./
COPY src/PartitionService.Core/PartitionService.Core.csproj src/PartitionService.Core/
COPY src/PartitionService.Contracts/PartitionService.Contracts.csproj src/PartitionService.Contracts/
COPY src/PartitionService.Server/PartitionService.Server.csproj src/PartitionService.Server/
RUN dotnet restore src/PartitionService.Server/PartitionService.Server.csproj
COPY .editorconfig LICENSE ./
COPY protos protos
COPY src/PartitionService.Core src/PartitionService.Core
COPY src/PartitionService.Contracts src/PartitionService.Contracts
COPY src/PartitionService.Server src/PartitionService.Server
RUN dotnet publish src/PartitionService.Server/PartitionService.Server.csproj \
    --configuration Release --no-restore --output /app -p:UseAppHost=false

FROM ${RUNTIME_IMAGE}
LABEL org.opencontainers.image.title="PartitionService" \
      org.opencontainers.image.description="Equilibrium distribution of trace elements between metal, slag and gas over gRPC" \
      org.opencontainers.image.licenses="MIT"
WORKDIR /app
COPY --from=build /app ./
# Any unprivileged user will do; the file system may be read-only.
USER 64198:64198
ENV PARTITION__LISTENADDRESS=0.0.0.0 \
    PARTITION__PORT=5080 \
    DOTNET_EnableDiagnostics=0
EXPOSE 5080
ENTRYPOINT ["dotnet", "PartitionService.Server.dll"]
