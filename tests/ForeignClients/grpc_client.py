"""A client that knows nothing of this repository but the committed descriptor set.

Refusals carry their details in one header of up to 40 KiB, 54 KiB on the wire. gRPC on the C core accepts 8 KiB of headers unless told
otherwise (newer releases 16 KiB) and turns a larger refusal into RESOURCE_EXHAUSTED, "received initial metadata size exceeds limit", so
that even the status is lost. Measured with version 1.51: 50 violations of a mass arrive with the default, 60 do not. A client on the C core
should set grpc.max_metadata_size to 65536, as this one does.
"""

import json
import pathlib
import sys

import grpc
from google.protobuf import any_pb2, descriptor_pb2, descriptor_pool, json_format, message_factory

ROOT = pathlib.Path(__file__).resolve().parents[2]
DESCRIPTORS = ROOT / "protos" / "partition.v1.descriptors.json"
METHOD = "/partition.v1.EquilibriumService/SolveCharge"
LARGE_METADATA = ("grpc.max_metadata_size", 64 * 1024)
DEADLINE_SECONDS = 30


def load_contract():
    """Builds the messages of the contract; the files of the set stand in the order of their imports."""
    files = json_format.Parse(DESCRIPTORS.read_text(encoding="utf-8"), descriptor_pb2.FileDescriptorSet())
    pool = descriptor_pool.DescriptorPool()
    for file in files.file:
        pool.Add(file)
    return message_class(pool, "partition.v1.SolveChargeRequest"), message_class(pool, "partition.v1.SolveChargeResponse")


def message_class(pool, name):
    """The class of a message, in the old and in the new way of the library."""
    descriptor = pool.FindMessageTypeByName(name)
    if hasattr(message_factory, "GetMessageClass"):
        return message_factory.GetMessageClass(descriptor)
    return message_factory.MessageFactory(pool).GetPrototype(descriptor)


def load_error_details():
    """The parts of google.rpc that are read here, by their published field numbers."""
    text, number = descriptor_pb2.FieldDescriptorProto.TYPE_STRING, descriptor_pb2.FieldDescriptorProto.TYPE_INT32
    message = descriptor_pb2.FieldDescriptorProto.TYPE_MESSAGE
    once, many = descriptor_pb2.FieldDescriptorProto.LABEL_OPTIONAL, descriptor_pb2.FieldDescriptorProto.LABEL_REPEATED
    file = descriptor_pb2.FileDescriptorProto(
        name="error_details.proto", package="google.rpc", syntax="proto3", dependency=["google/protobuf/any.proto"]
    )
    declared = {
        "Status": [("code", 1, number, once, ""), ("message", 2, text, once, ""), ("details", 3, message, many, ".google.protobuf.Any")],
        "FieldViolation": [("field", 1, text, once, ""), ("description", 2, text, once, ""), ("reason", 3, text, once, "")],
        "BadRequest": [("field_violations", 1, message, many, ".google.rpc.FieldViolation")],
    }
    for name, fields in declared.items():
        entry = file.message_type.add(name=name)
        for field, tag, kind, label, of in fields:
            entry.field.add(name=field, number=tag, type=kind, label=label, type_name=of or None)
    pool = descriptor_pool.DescriptorPool()
    pool.AddSerializedFile(any_pb2.DESCRIPTOR.serialized_pb)
    pool.Add(file)
    return message_class(pool, "google.rpc.Status"), message_class(pool, "google.rpc.BadRequest")


def violations_of(refusal):
    """The field violations in the trailer of a refused call."""
    status_class, bad_request_class = load_error_details()
    trailers = {entry.key: entry.value for entry in refusal.trailing_metadata()}
    status = status_class.FromString(trailers["grpc-status-details-bin"])
    for detail in status.details:
        if detail.type_url.endswith("/google.rpc.BadRequest"):
            return bad_request_class.FromString(detail.value).field_violations
    return []


def call(address, request, options, request_class, response_class):
    """Solves one case."""
    with grpc.insecure_channel(address, options=options) as channel:
        method = channel.unary_unary(METHOD, request_serializer=request_class.SerializeToString, response_deserializer=response_class.FromString)
        return method(request, timeout=DEADLINE_SECONDS)


def refused(address, request, options, *classes):
    """The violations of a case that must be refused."""
    try:
        call(address, request, options, *classes)
    except grpc.RpcError as refusal:
        if refusal.code() is not grpc.StatusCode.INVALID_ARGUMENT:
            raise
        return violations_of(refusal)
    raise AssertionError("a case with negative masses was answered")


def spoil(request, count):
    """Replaces the charge by so many items with a negative mass."""
    del request.vessel_case.charge[:]
    for index in range(count):
        request.vessel_case.charge.add(formula="Cu", mass_kg=-1.0 - index)


def check(condition, text):
    """Fails with a text; unlike assert it holds under python -O too."""
    if not condition:
        raise AssertionError(text)


def main(action, address, request_file):
    """Solves the example, or reads a refusal with few or with many violations."""
    classes = load_contract()
    request = json_format.Parse(pathlib.Path(request_file).read_text(encoding="utf-8"), classes[0]())
    if action == "solve":
        answer = call(address, request, [LARGE_METADATA], *classes)
        print(json.dumps(json_format.MessageToDict(answer)))
        return
    count = {"few": 8, "many": 200}[action]
    spoil(request, count)
    found = refused(address, request, [] if action == "few" else [LARGE_METADATA], *classes)
    fields = [violation.field for violation in found]
    expected = [f"vessel_case.charge[{index}].mass_kg" for index in range(count)]
    check([field for field in fields if field.endswith(".mass_kg")] == expected, f"{len(fields)} violations: {fields[:5]}")
    check("-1; must be 0 or a number in [" in found[0].description, found[0].description)


if __name__ == "__main__":
    main(*sys.argv[1:])
