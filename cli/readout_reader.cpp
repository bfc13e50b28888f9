#include "gainsay/cli/readout_reader.h"

#include <algorithm>
#include <optional>
#include <utility>

namespace gainsay::cli {

namespace {

using estimation::Coefficient;

constexpr std::string_view kUnknown = "unknown";
constexpr std::string_view kUnknownPer = "unknown per ";
constexpr std::string_view kPerExperiment = "unknown per experiment";
constexpr std::string_view kSameAs = "same as ";

// A scale or an offset: a number, "unknown", "unknown per experiment".
Coefficient read_coefficient(const CheckedTable& table, std::string_view key, double otherwise,
                             Diagnostics& diagnostics) {
  Coefficient coefficient{Coefficient::Kind::Fixed, otherwise};
  const TomlValue* value = table.value(key);
  if (value == nullptr) return coefficient;
  if (value->is_number()) {
    coefficient.value = value->number;
    if (key == "scale" && value->number == 0.0) {
      diagnostics.error(value->place, {"a scale of 0 shows nothing", "a number other than 0",
                                       "correct the scale"});
    }
    return coefficient;
  }
  if (value->text == kUnknown) {
    coefficient.kind = Coefficient::Kind::Unknown;
  } else if (value->text == kPerExperiment) {
    coefficient.kind = Coefficient::Kind::PerExperiment;
  } else if (value->text.starts_with(kUnknownPer)) {
    say_not_yet(value->place, value->text, "write \"unknown per experiment\"", diagnostics);
  } else {
    diagnostics.error(value->place,
                      {"'" + value->text + "' is no " + std::string(key),
                       "a number, \"unknown\" or \"unknown per experiment\"",
                       "correct it; an unknown with a range of its own belongs under [unknowns] "
                       "and into shows"});
  }
  return coefficient;
}

// A part of the noise as a number from 0 up; false where it is given in words.
bool read_number(const TomlValue& value, std::string_view key, std::optional<double>& part,
                 Diagnostics& diagnostics) {
  if (!value.is_number()) return false;
  part = value.number;
  if (value.number < 0.0) {
    diagnostics.error(value.place, {"'" + std::string(key) + "' of the noise is negative",
                                    "a number from 0 up", "correct it"});
  }
  return true;
}

void refuse_words(const TomlValue& value, std::string_view key, std::string_view expected,
                  Diagnostics& diagnostics) {
  if (value.text == kUnknown || value.text == "from replicates") {
    say_not_yet(value.place, std::string(key) + " = \"" + value.text + "\"",
                "give a number, or an sd column; sd = \"unknown\" stands alone", diagnostics);
  } else {
    diagnostics.error(value.place,
                      {"'" + value.text + "' is no " + std::string(key) + " of the noise",
                       std::string(expected), "correct it"});
  }
}

// A number, "unknown", or "same as NAME": the unknown sd of another readout.
void read_sd(const CheckedTable& table, estimation::Noise& noise, Diagnostics& diagnostics) {
  const TomlValue* value = table.value("sd");
  if (value == nullptr || read_number(*value, "sd", noise.sd, diagnostics)) return;
  if (value->text == kUnknown) {
    noise.sd_unknown = true;
  } else if (value->text.starts_with(kSameAs)) {
    noise.sd_unknown = true;
    noise.same_as = value->text.substr(kSameAs.size());
  } else {
    refuse_words(*value, "sd", "a number, \"unknown\", or \"same as\" and a readout", diagnostics);
  }
}

void read_relative(const CheckedTable& table, estimation::Noise& noise, Diagnostics& diagnostics) {
  const TomlValue* value = table.value("relative");
  if (value == nullptr || read_number(*value, "relative", noise.relative, diagnostics)) return;
  refuse_words(*value, "relative", "a number", diagnostics);
}

estimation::Noise read_noise(const TomlValue& value, Diagnostics& diagnostics) {
  const CheckedTable table(value, Section::Noise, Section::Study, diagnostics);
  estimation::Noise noise;
  const std::size_t errors = diagnostics.errors();
  read_sd(table, noise, diagnostics);
  read_relative(table, noise, diagnostics);
  if (diagnostics.errors() > errors || table.entries().size() < value.entries.size()) return noise;
  if (noise.sd_unknown && noise.relative) {
    say_not_yet(table.entry("relative")->place, "relative beside sd = \"unknown\"",
                "leave relative out, or give both as numbers", diagnostics);
    noise.relative.reset();
  } else if (!noise.sd_unknown && noise.sd.value_or(0.0) == 0.0 &&
             noise.relative.value_or(0.0) == 0.0) {
    diagnostics.error(value.place, {"the noise is nothing", "sd or relative above 0",
                                    "give how much the readout scatters; no instrument reads "
                                    "without scatter"});
  }
  return noise;
}

// One of two words, or what to say.
std::string one_of(const CheckedTable& table, std::string_view key,
                   const std::vector<std::string_view>& words, std::string_view expected,
                   Diagnostics& diagnostics) {
  const auto text = table.text(key);
  if (!text) return {};
  for (const std::string_view word : words) {
    if (*text == word) return *text;
  }
  diagnostics.error(table.value(key)->place, {"'" + *text + "' is no " + std::string(key),
                                              std::string(expected), "write one of these"});
  return {};
}

ReadReadout read_readout(const TomlEntry& entry, Diagnostics& diagnostics) {
  const CheckedTable table(entry.value, Section::Readout, Section::Study, diagnostics);
  ReadReadout read;
  read.place = entry.place;
  estimation::Readout& readout = read.readout;
  readout.name = entry.key;
  readout.title = table.text("title").value_or(entry.key);
  readout.unit = table.text("unit").value_or("");
  if (const TomlValue* shows = table.value("shows")) {
    const std::string role = "what '" + entry.key + "' shows";
    if (auto written = read_expression(*shows, role, Leans::OnAnything, diagnostics)) {
      readout.shows = written->expression;
      read.shows = *std::move(written);
    }
  } else if (table.lacks("shows")) {
    diagnostics.error(entry.place, {"the readout '" + entry.key + "' does not say what it shows",
                                    "shows = \"...\"", "add it, as shows = \"enzyme\""});
  }
  readout.scale = read_coefficient(table, "scale", 1.0, diagnostics);
  readout.offset = read_coefficient(table, "offset", 0.0, diagnostics);
  readout.is_signed = table.truth("signed");
  if (readout.is_signed && readout.scale.kind == Coefficient::Kind::Fixed) {
    diagnostics.error(table.entry("signed")->place,
                      {"'signed' stands beside a scale that is a number",
                       "signed beside scale = \"unknown\"", "remove it; a number bears its sign"});
  }
  read.says_noise = table.mentions("noise");
  if (const TomlValue* noise = table.value("noise"))
    readout.noise = read_noise(*noise, diagnostics);
  read.sd_of = one_of(table, "sd_of", {"reading", "mean"}, "\"reading\" or \"mean\"", diagnostics);
  readout.logarithmic_axis =
      one_of(table, "axis", {"log", "linear"}, "\"log\" or \"linear\"", diagnostics) == "log";
  return read;
}

// The readout whose unknown sd another shares must have one of its own.
void check_shared_noise(const std::vector<ReadReadout>& readouts, Diagnostics& diagnostics) {
  for (const ReadReadout& read : readouts) {
    const std::string& owner = read.readout.noise.same_as;
    if (owner.empty()) continue;
    const auto found = std::ranges::find_if(
        readouts, [&](const ReadReadout& other) { return other.readout.name == owner; });
    const bool usable = found != readouts.end() && found->readout.noise.sd_unknown &&
                        found->readout.noise.same_as.empty();
    if (usable) continue;
    diagnostics.error(read.place,
                      {"the noise of '" + read.readout.name + "' is the same as that of '" + owner +
                           "', which has no unknown sd of its own",
                       "a readout with noise = { sd = \"unknown\" }",
                       "correct the name, or give '" + owner + "' that noise"});
  }
}

}  // namespace

std::vector<ReadReadout> read_readouts(const CheckedTable& top, Diagnostics& diagnostics) {
  std::vector<ReadReadout> readouts;
  const auto names = inner_table(top, "readouts", Section::Readouts, Section::Study, diagnostics);
  if (!names) return readouts;
  for (const TomlEntry* entry : names->entries()) {
    if (entry->key.empty()) {
      diagnostics.error(entry->place, {"a readout has an empty name", "a name", "give it one"});
      continue;
    }
    readouts.push_back(read_readout(*entry, diagnostics));
  }
  check_shared_noise(readouts, diagnostics);
  return readouts;
}

}  // namespace gainsay::cli
