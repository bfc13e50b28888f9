#pragma once

#include <string>
#include <vector>

namespace gainsay::cli {

struct Tick {
  double at = 0.0;  ///< share of the axis' length
  double value = 0.0;
  std::string label;  ///< empty for one that carries no number
};

/// An axis: takes values to shares of its length, 0 at the low end and 1 at the high one.
class Scale {
 public:
  /// From `low` to `high`, widened to the next round numbers; equal ends are set apart. Zero is
  /// taken in where it lies near.
  static Scale linear(double low, double high);
  /// `low` and `high` above zero; widened by a small share at both ends.
  static Scale logarithmic(double low, double high);
  /// With exactly these ends.
  static Scale exact(double low, double high, bool logarithmic);

  bool is_logarithmic() const { return logarithmic_; }
  double low() const { return low_; }
  double high() const { return high_; }

  /// Share of the length, not cut off at the ends. What a logarithm cannot show (0 and below) is
  /// put at the lower end: `can_show` is false there, and pictures mark it.
  double place(double value) const;
  bool can_show(double value) const { return !logarithmic_ || value > 0.0; }

  /// Round numbers, about `wanted` of them: steps of 1, 2 or 5 times a power of ten; on a
  /// logarithmic axis powers of ten, with 2 and 5 between them where there are few.
  std::vector<Tick> ticks(int wanted) const;

 private:
  Scale(double low, double high, bool logarithmic)
      : low_(low), high_(high), logarithmic_(logarithmic) {}
  double low_;
  double high_;
  bool logarithmic_;
};

}  // namespace gainsay::cli
