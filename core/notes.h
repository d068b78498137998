// SPDX-License-Identifier: MPL-2.0
#pragma once

#include <string>
#include <vector>

namespace core {

/// Where a relation leaves what a reader may want to see besides the result. A step is a line of
/// the derivation; a remark is what should be known about a result that stands; an uncertainty is the
/// standard uncertainty that published data leave the result, in its SI unit, independent of others.
/// All are given as functions, so that nothing is built when nobody listens.
class Notes {
public:
    constexpr Notes() = default;
    constexpr Notes(std::vector<std::string>* steps, std::vector<std::string>* remarks,
                    double* variance = nullptr)
        : steps_(steps), remarks_(remarks), variance_(variance) {}

    template<class Text>
    void step(Text&& text) const {
        if (steps_ != nullptr) steps_->push_back(text());
    }
    template<class Text>
    void remark(Text&& text) const {
        if (remarks_ != nullptr) remarks_->push_back(text());
    }
    template<class StandardUncertainty>
    void uncertainty(StandardUncertainty&& u) const {
        if (variance_ == nullptr) return;
        const double value = u();
        *variance_ += value * value;
    }
    bool hears_steps() const { return steps_ != nullptr; }
    /// Whether it is worth finding out what to remark.
    bool hears_remarks() const { return remarks_ != nullptr; }

private:
    std::vector<std::string>* steps_ = nullptr;
    std::vector<std::string>* remarks_ = nullptr;
    double* variance_ = nullptr;
};

/// For callers without a listener.
inline constexpr Notes silent{};

} // namespace core
