#include "gainsay/cli/written_expression.h"

#include <utility>

namespace gainsay::cli {

std::optional<WrittenExpression> read_expression(const TomlValue& value, std::string role,
                                                 Leans leans, Diagnostics& diagnostics,
                                                 const core::ParseContext& context) {
  if (value.is_number()) {
    return WrittenExpression{value.number, {}, std::move(role), leans, value.place};
  }
  const core::Result<core::Parsed> parsed = core::parse(value.text, context);
  if (!parsed) {
    const core::Failure& failure = parsed.failure();
    diagnostics.error(failure.place ? place_in(value, failure.place->offset) : value.place,
                      {failure.what + " (in " + role + ")", failure.expected, failure.to_do});
    return std::nullopt;
  }
  WrittenExpression written{parsed->expression, {}, std::move(role), leans, value.place};
  for (const core::NamedPlace& named : parsed->names) {
    written.names.push_back({named.name, place_in(value, named.place.offset)});
  }
  return written;
}

}  // namespace gainsay::cli
